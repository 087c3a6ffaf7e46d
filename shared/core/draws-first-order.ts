import type { Layout } from './draws-layout.ts';
import type { FoldedPlan } from './linear-model.ts';
import { weigh } from './linear-model-weigh.ts';
import { NOTHING } from './lump.ts';

/** Standard uncertainties to first order, g and mm, and each deviate's share of the variance. */
export interface FirstOrder {
  mass: number;
  balance: number;
  massShares: Float64Array;
  balanceShares: Float64Array;
}

/** Standard deviation of an even deviate from −1 to 1. */
const EVEN = 1 / Math.sqrt(3);

/**
 * Propagation of uncertainty by the slopes alone (JCGM 100:2008, 5.1.2): ∂M/∂mᵢ = 1, ∂x/∂mᵢ = (xᵢ − x)/M, what moves
 * together added up first. Glue by share adds its share to whatever its wood does, which the sheet's own uncertainty
 * leaves out.
 * @example firstOrderOf(foldPlan(EXAMPLE_PLAN), layoutOf(foldPlan(EXAMPLE_PLAN), { spreads: { thickness: 0 } })).mass.toFixed(6) // → '0.575235'
 */
export function firstOrderOf(fold: FoldedPlan, layout: Layout): FirstOrder {
  const { mass: wholeMass, at } = weigh(fold);
  const wholeX = at?.[0] ?? 0;
  const byMass = new Float64Array(layout.normals + layout.evens);
  const byX = new Float64Array(byMass.length);
  const add = (place: number, grams: number, arm: number) => {
    byMass[place] = (byMass[place] ?? 0) + grams;
    const shift = wholeMass > NOTHING ? (grams * (arm - wholeX)) / wholeMass : 0;
    byX[place] = (byX[place] ?? 0) + shift;
  };
  let even = layout.normals;
  let follows = layout.mass.length;
  for (const { from, to, followers } of layout.stretches) {
    const behind = followers.reduce((sum, { share }) => sum + share, 1);
    let [grams, turn] = [0, 0];
    for (let i = from; i < to; i++) {
      const [mass, x] = [layout.mass[i] ?? 0, layout.x[i] ?? 0];
      grams += mass;
      turn += mass * x;
      add(layout.normal[i] ?? i, behind * (layout.slope[i] ?? 0), x);
      const tolerance = layout.tolerance[i] ?? 0;
      if (tolerance > 0) add(even++, behind * mass * tolerance * EVEN, x);
    }
    for (const { slope } of followers) add(follows++, slope * grams, grams > 0 ? turn / grams : 0);
  }
  const root = (values: Float64Array) => Math.hypot(...values);
  const shares = (values: Float64Array) => {
    const variance = root(values) ** 2;
    return values.map((v) => (variance > 0 ? v ** 2 / variance : 0));
  };
  return {
    mass: root(byMass),
    balance: root(byX),
    massShares: shares(byMass),
    balanceShares: shares(byX),
  };
}
