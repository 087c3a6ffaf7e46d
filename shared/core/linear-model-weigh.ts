import { percentOfMac } from './balance.ts';
import type { Vec3 } from './frame.ts';
import { figureOf, type FoldedPlan } from './linear-model.ts';
import { NOTHING } from './lump.ts';
import type { PlanMaterial } from './plan.ts';

/** What a folded plan weighs, g, and where it balances, mm in body axes. */
export interface Weighing {
  /** of each line, in their order */
  masses: Float64Array;
  /** of each line about the datum, g·mm */
  moments: Vec3[];
  mass: number;
  wingMass: number;
  /** null where nothing has a mass */
  at: Vec3 | null;
  percentMac: number | null;
}

/**
 * Masses and balance of a folded plan: the same figures that `estimate` comes to, by one product a line. `figures`
 * are g per mm³ or mm² for each line, by default the plan's own.
 * @example weigh(foldPlan(EXAMPLE_PLAN)).mass // → 19.256
 */
export function weigh(fold: FoldedPlan, figures?: ArrayLike<number>): Weighing {
  const { lines, wing } = fold;
  const masses = new Float64Array(lines.length);
  const moments = lines.map((): Vec3 => [0, 0, 0]);
  lines.forEach(({ by, amount, first, figure }, i) => {
    if (by === 'share') return;
    const grams = figures?.[i] ?? figure;
    masses[i] = amount * grams;
    moments[i] = [first[0] * grams, first[1] * grams, first[2] * grams];
  });
  lines.forEach(({ by, amount, of }, i) => {
    if (by !== 'share') return;
    const sum = (valueOf: (j: number) => number) => amount * of.reduce((all, j) => all + valueOf(j), 0);
    masses[i] = sum((j) => masses[j] ?? 0);
    const along = (axis: 0 | 1 | 2) => sum((j) => moments[j]?.[axis] ?? 0);
    moments[i] = [along(0), along(1), along(2)];
  });
  const mass = masses.reduce((sum, m) => sum + m, 0);
  const mean = (axis: 0 | 1 | 2) => moments.reduce((sum, m) => sum + m[axis], 0) / mass;
  const at: Vec3 | null = mass < NOTHING ? null : [mean(0), mean(1), mean(2)];
  return {
    masses,
    moments,
    mass,
    wingMass: lines.reduce(
      (sum, { surface }, i) =>
        surface !== null && fold.wings.includes(surface) ? sum + (masses[i] ?? 0) : sum,
      0,
    ),
    at,
    percentMac: at && wing ? percentOfMac(at[0], wing.xLeMac, wing.mac) : null,
  };
}

/** A wood to weigh a line with, under its key. */
export interface OtherWood {
  key: string;
  material: PlanMaterial;
}

/**
 * The folded plan with other materials for some lines, by their ids; glue by share follows its wood. Null where a
 * line's amount says nothing of its new material: one is known by its density and the other by its areal mass, or
 * only one of them is wood. Then the plan has to be folded anew.
 * @example weigh(withOther(foldPlan(EXAMPLE_PLAN), { 'wing/skin': { key: 'hard', material: { name: 'Hard', category: 'wood', density: 200, cv: 0.1 } } })).mass // → 24.256
 */
export function withOther(fold: FoldedPlan, others: Readonly<Record<string, OtherWood>>): FoldedPlan | null {
  const lines = [];
  for (const line of fold.lines) {
    const other = others[line.id];
    if (!other) lines.push(line);
    else {
      const { key, material } = other;
      if (line.by !== 'density' || material.density === undefined) return null;
      if (line.wood !== (material.category === 'wood')) return null;
      lines.push({ ...line, material: key, figure: figureOf(material, 'density'), cv: material.cv });
    }
  }
  return { ...fold, lines };
}
