import { percentOfMac } from '../balance.ts';
import { NOTHING } from '../lump.ts';
import type { Plan } from '../plan.ts';
import { wingReference } from '../wing-reference.ts';
import {
  hear,
  massAt,
  ownVariance,
  startBuilt,
  weightsOf,
  type BuiltState,
  type Heard,
} from './as-built-state.ts';
import { spreadOf } from './belief.ts';
import { materialNews, type MaterialNews } from './material-news.ts';
import { sidedLines, type SidedLine } from './sided-lines.ts';
import type { Weighing } from './weighing.ts';

/** A line on its side as the account has it. */
export interface BuiltPart extends SidedLine {
  /** g, as drawn */
  estimated: number;
  /** id of the weighing that counts; null while it is still to come */
  weighing: string | null;
}

/** The whole model as far as it is built and as it is forecast. Masses g, lengths mm. */
export interface AsBuilt {
  /** `mass` and `at` as they stand; `u` of those still to come */
  parts: BuiltPart[];
  /** on the scale so far, and what the rest is forecast to weigh */
  weighed: number;
  toCome: number;
  mass: number;
  u: number;
  /** mm aft of the datum, and in % MAC; null without mass or wing */
  x: number | null;
  ux: number | null;
  percentMac: number | null;
  uPercentMac: number | null;
  /** port less starboard is what the lateral balance shows, mm to starboard */
  y: number | null;
  materials: MaterialNews[];
  heard: Heard[];
}

/**
 * The account of a model while it is built: weighings take the place of estimates, and what they say of a material
 * moves the forecast of its parts still to come. With nothing weighed all masses are the estimate's; with
 * everything weighed the mass is the sum of the readings. The band counts what parts of a material have in common,
 * so it is wider than the sheet's, which takes every part for itself, until enough is weighed.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example asBuilt(EXAMPLE_PLAN, []).mass.toFixed(3) // → '19.256'
 * @example asBuilt(EXAMPLE_PLAN, [{ id: 'a', covers: [{ line: 'item/nose', side: 'middle' }], mass: 12, u: 0.03 }]).mass.toFixed(3) // → '21.256'
 */
export function asBuilt(plan: Plan, weighings: readonly Weighing[]): AsBuilt {
  const state = weighings.reduce(hear, startBuilt(sidedLines(plan), plan.materials));
  return accountOf(plan, state);
}

/**
 * What an account comes to.
 * @example accountOf(EXAMPLE_PLAN, EXAMPLE_BUILT).toCome.toFixed(3) // → '19.256'
 */
export function accountOf(plan: Plan, state: BuiltState): AsBuilt {
  const { lines } = state;
  const masses = lines.map((_, i) => massAt(state, i));
  const mass = total(masses);
  const weighed = total(masses.map((m, i) => (state.by[i] === null ? 0 : m)));
  const at = (axis: (i: number) => number) =>
    mass < NOTHING ? null : total(masses.map((m, i) => m * axis(i))) / mass;
  const x = at((i) => state.x[i] ?? 0);
  const wing = wingReference(plan);
  const ux = x === null ? null : bandOf(state, (i) => ((state.x[i] ?? 0) - x) / mass);
  return {
    parts: lines.map((line, i) => ({
      ...line,
      estimated: line.mass,
      mass: masses[i] ?? 0,
      at: [state.x[i] ?? 0, line.at[1], line.at[2]],
      weighing: state.by[i] ?? null,
    })),
    weighed,
    toCome: mass - weighed,
    mass,
    u: bandOf(state, () => 1),
    x,
    ux,
    percentMac: x === null || !wing ? null : percentOfMac(x, wing.xLeMac, wing.mac),
    uPercentMac: ux === null || !wing ? null : (100 * ux) / wing.mac,
    y: at((i) => lines[i]?.at[1] ?? 0),
    materials: materialNews(state, plan.materials),
    heard: state.heard,
  };
}

/** Standard uncertainty of Σ factor·mass: readings each for themselves, the rest by material and by part. */
function bandOf(state: BuiltState, factor: (i: number) => number): number {
  const readings = new Map<string, number[]>();
  const toCome: number[] = [];
  state.by.forEach((by, i) => {
    if (by === null) toCome.push(i);
    else readings.set(by, [...(readings.get(by) ?? []), i]);
  });
  const ofReadings = [...readings].map(([id, places]) => {
    const heard = state.heard.find((one) => one.id === id);
    if (!heard) return 0;
    const share = (i: number) =>
      heard.measured > NOTHING ? massAt(state, i) / heard.measured : 1 / places.length;
    return heard.u * total(places.map((i) => share(i) * factor(i)));
  });
  const ofParts = toCome.map((i) => factor(i) * Math.sqrt(ownVariance(state, i)));
  const ofMaterials = spreadOf(state.belief, weightsOf(state, toCome, factor));
  return Math.hypot(ofMaterials, ...ofReadings, ...ofParts);
}

const total = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0);
