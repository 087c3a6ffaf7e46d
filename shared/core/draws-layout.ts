import { scattersOf, type Cause, type Scatter, type ScatterOptions } from './draws-causes.ts';
import type { FoldedPlan } from './linear-model.ts';

/** Glue by share behind the wood that it is a share of; its deviate stands behind those of the lines. */
export interface Follower {
  share: number;
  /** deviation of the share per deviate */
  slope: number;
}

/** Lines that are summed for themselves, because glue follows their sum: those with a thickness first. */
export interface Stretch {
  from: number;
  /** first line that has no thickness to scatter by */
  sticks: number;
  to: number;
  followers: Follower[];
}

/** Lines laid out for the drawing loop, each with its own place in flat arrays. */
export interface Layout {
  stretches: Stretch[];
  mass: Float64Array;
  slope: Float64Array;
  tolerance: Float64Array;
  /** arm, mm */
  x: Float64Array;
  /** place of the normal deviate that a line takes: its own, or that of the first line of its measured piece */
  normal: Int32Array;
  /** lines and followers, each with a normal deviate; followers come last */
  normals: number;
  /** lines with a thickness, in their order */
  evens: number;
  /** cause of each deviate by its place, the normal ones first */
  causeOf: Int32Array;
  causes: Cause[];
}

const still: Scatter = { slope: 0, tolerance: 0, cause: 0 };

/** Lines in groups that glue follows, with the glue; the last group is followed by none. */
function groupsOf({ lines }: FoldedPlan): { of: readonly number[]; glue: number[] }[] {
  const groups = new Map<string, { of: readonly number[]; glue: number[] }>();
  lines.forEach(({ by, of }, i) => {
    if (by !== 'share' || of.length === 0) return;
    const group = groups.get(of.join()) ?? { of, glue: [] };
    group.glue.push(i);
    groups.set(of.join(), group);
  });
  const glued = new Set([...groups.values()].flatMap(({ of }) => [...of]));
  const free = lines.flatMap(({ by }, i) => (by !== 'share' && !glued.has(i) ? [i] : []));
  return [...groups.values(), { of: free, glue: [] }];
}

/**
 * Lays a folded plan out for drawing.
 * @example layoutOf(foldPlan(EXAMPLE_PLAN), {}).evens // → 2
 */
export function layoutOf(fold: FoldedPlan, options: ScatterOptions): Layout {
  const { causes, scatters, masses } = scattersOf(fold, options);
  const scatterOf = (i: number) => scatters[i] ?? still;
  const stretches: Stretch[] = [];
  const order: number[] = [];
  const glues: number[] = [];
  for (const { of, glue } of groupsOf(fold)) {
    const from = order.length;
    order.push(...of.filter((i) => scatterOf(i).tolerance > 0));
    const sticks = order.length;
    order.push(...of.filter((i) => scatterOf(i).tolerance === 0));
    const followers = glue.map((i): Follower => {
      const [mass, share] = [masses[i] ?? 0, fold.lines[i]?.amount ?? 0];
      return { share, slope: mass > 0 ? (share * scatterOf(i).slope) / mass : 0 };
    });
    glues.push(...glue);
    stretches.push({ from, sticks, to: order.length, followers });
  }
  const causeAt = [...order, ...glues].map((i) => scatterOf(i).cause);
  const sheets = order.filter((i) => scatterOf(i).tolerance > 0);
  const armOf = (i: number) => {
    const line = fold.lines[i];
    return line && line.amount > 0 ? line.first[0] / line.amount : 0;
  };
  return {
    stretches,
    mass: Float64Array.from(order, (i) => masses[i] ?? 0),
    slope: Float64Array.from(order, (i) => scatterOf(i).slope),
    tolerance: Float64Array.from(order, (i) => scatterOf(i).tolerance),
    x: Float64Array.from(order, armOf),
    normal: Int32Array.from(order, (_, place) => causeAt.indexOf(causeAt[place] ?? 0)),
    normals: causeAt.length,
    evens: sheets.length,
    causeOf: Int32Array.from([...causeAt, ...sheets.map((i) => scatterOf(i).cause)]),
    causes,
  };
}
