import { runningArc, runningArea, type FaceName, type Running } from './section-running.ts';
import type { Section } from './section.ts';

/**
 * An area or an arc of a section of unit chord between two x/c, with first moments: all are shares of the chord, its
 * square or its cube. Running integrals are made once per section and extrapolated from two step widths, so that
 * 200 nodes give eight digits on a smooth section and exactness on a polygon.
 */
export interface Sums {
  /** of the section's area, or of the arc's length */
  amount: number;
  /** first moments about nose and chord line */
  x: number;
  z: number;
}

interface RunningSet {
  area?: Running;
  upper?: Running;
  lower?: Running;
}
/** Running integrals belong to their section and go with it; a section never changes once read. */
const running = new WeakMap<Section, RunningSet>();

function setOf(section: Section): RunningSet {
  let set = running.get(section);
  if (!set) running.set(section, (set = {}));
  return set;
}

/** Index of the interval that holds x. */
function intervalOf(nodes: Float64Array, x: number): number {
  let low = 0;
  let high = nodes.length - 2;
  while (low < high) {
    const mid = (low + high + 1) >> 1;
    if ((nodes[mid] ?? 0) <= x) low = mid;
    else high = mid - 1;
  }
  return low;
}

const clamp01 = (x: number) => Math.min(1, Math.max(0, x));

/** How far x lies into the interval i, as a share of its width. */
function shareOf(nodes: Float64Array, i: number, x: number): number {
  const width = (nodes[i + 1] ?? 1) - (nodes[i] ?? 0);
  return width > 0 ? (x - (nodes[i] ?? 0)) / width : 0;
}

/**
 * Value of a running integral where a share of what the interval i holds has been passed; `foreX` and `foreZ` are how
 * far the middle of that part lies before that of the whole interval.
 */
function passed(run: Running, i: number, share: number, foreX: number, foreZ: number): Sums {
  const amount = share * ((run.amount[i + 1] ?? 0) - (run.amount[i] ?? 0));
  return {
    amount: (run.amount[i] ?? 0) + amount,
    x: (run.x[i] ?? 0) + share * ((run.x[i + 1] ?? 0) - (run.x[i] ?? 0)) - amount * foreX,
    z: (run.z[i] ?? 0) + share * ((run.z[i + 1] ?? 0) - (run.z[i] ?? 0)) - amount * foreZ,
  };
}

const thicknessAt = ({ upper, lower }: Section, i: number) => Math.max(0, (upper[i] ?? 0) - (lower[i] ?? 0));
const middleAt = ({ upper, lower }: Section, i: number) => ((upper[i] ?? 0) + (lower[i] ?? 0)) / 2;

/**
 * Area from the nose to `to`. Inside an interval the thickness is taken as linear, so the area grows as a parabola
 * and its middle moves aft.
 */
function areaTo(section: Section, run: Running, to: number): Sums {
  const { x } = section;
  const i = intervalOf(x, to);
  const f = shareOf(x, i, to);
  const t0 = thicknessAt(section, i);
  const t1 = thicknessAt(section, i + 1);
  if (t0 + t1 <= 0) return passed(run, i, f, 0, 0);
  const reached = t0 + f * (t1 - t0);
  const back =
    (t0 + 2 * t1) / (3 * (t0 + t1)) -
    (t0 + reached > 0 ? (f * (t0 + 2 * reached)) / (3 * (t0 + reached)) : 0);
  return passed(
    run,
    i,
    (f * (t0 + reached)) / (t0 + t1),
    back * ((x[i + 1] ?? 1) - (x[i] ?? 0)),
    back * (middleAt(section, i + 1) - middleAt(section, i)),
  );
}

/** Arc of a face from the nose to `to`. */
function arcTo(x: Float64Array, z: Float64Array, run: Running, to: number): Sums {
  const i = intervalOf(x, to);
  const f = shareOf(x, i, to);
  const back = (1 - f) / 2;
  return passed(run, i, f, back * ((x[i + 1] ?? 1) - (x[i] ?? 0)), back * ((z[i + 1] ?? 0) - (z[i] ?? 0)));
}

const difference = (a: Sums, b: Sums): Sums => ({ amount: a.amount - b.amount, x: a.x - b.x, z: a.z - b.z });

/**
 * Area between two x/c with its first moments, unit chord. Limits beyond nose or tail are taken there.
 * @example areaBetween(readSection({ flat: 3 }, 100), 0.2, 0.7).amount.toFixed(6) // → '0.015000'
 */
export function areaBetween(section: Section, from: number, to: number): Sums {
  const run = (setOf(section).area ??= runningArea(section));
  const a = clamp01(Math.min(from, to));
  const b = clamp01(Math.max(from, to));
  return difference(areaTo(section, run, b), areaTo(section, run, a));
}

/**
 * Mean square of the area's distance along x from its centroid between two x/c, unit chord: what a rib adds to the
 * inertia by its own extent. Eight slices give it to half a percent, ample for a share of a share.
 * @example spreadBetween(readSection({ flat: 3 }, 100), 0, 1).toFixed(6) // → '0.083333'
 */
export function spreadBetween(section: Section, from: number, to: number): number {
  const slices = 8;
  const width = (to - from) / slices;
  let [amount, x, xx] = [0, 0, 0];
  for (let i = 0; i < slices; i++) {
    const slice = areaBetween(section, from + i * width, from + (i + 1) * width);
    if (slice.amount <= 0) continue;
    amount += slice.amount;
    x += slice.x;
    xx += slice.x ** 2 / slice.amount + (slice.amount * width ** 2) / 12;
  }
  return amount > 0 ? Math.max(0, xx / amount - (x / amount) ** 2) : 0;
}

/**
 * Developed length of one face between two x/c with its first moments, unit chord. From the nose on, the upper face
 * takes in the hair's breadth of a cambered section that lies in front of x = 0.
 * @example arcBetween(readSection({ flat: 3 }, 100), 'upper', 0.2, 0.7) // → { amount: 0.5, x: 0.225, z: 0.0075 }
 */
export function arcBetween(section: Section, face: FaceName, from: number, to: number): Sums {
  const set = setOf(section);
  const run = (set[face] ??= runningArc(section, face));
  const { x, [face]: z } = section;
  const a = clamp01(Math.min(from, to));
  const b = clamp01(Math.max(from, to));
  const arc = difference(arcTo(x, z, run, b), arcTo(x, z, run, a));
  if (face === 'lower' || a > 0 || b <= 0) return arc;
  return {
    amount: arc.amount + section.noseOnTop,
    x: arc.x,
    z: arc.z + (section.noseOnTop * (section.upper[0] ?? 0)) / 2,
  };
}

/**
 * Developed length, unit chord, from x/c `start` on top, forward round the nose, to `end` on the bottom, with its
 * first moments. A plate's square front edge is not part of it.
 * @example wrapArc(readSection({ flat: 3 }, 100), 0.3, 0.1).amount // → 0.4
 */
export function wrapArc(section: Section, start: number, end: number): Sums {
  const top = arcBetween(section, 'upper', 0, start);
  const bottom = arcBetween(section, 'lower', 0, end);
  const middle = ((section.upper[0] ?? 0) + (section.lower[0] ?? 0)) / 2;
  return {
    amount: top.amount + bottom.amount + section.noseFace,
    x: top.x + bottom.x,
    z: top.z + bottom.z + section.noseFace * middle,
  };
}

/**
 * z/c of a face at x/c, by straight lines between the section's nodes; beyond nose and tail that at the end.
 * @example ordinateAt(readSection({ flat: 3 }, 100), 'lower', 0.3) // → -0.015
 */
export function ordinateAt(section: Section, face: FaceName, x: number): number {
  const i = intervalOf(section.x, clamp01(x));
  const x0 = section.x[i] ?? 0;
  const x1 = section.x[i + 1] ?? 1;
  const z = section[face];
  const f = x1 > x0 ? (clamp01(x) - x0) / (x1 - x0) : 0;
  return (z[i] ?? 0) + f * ((z[i + 1] ?? 0) - (z[i] ?? 0));
}

/**
 * Thickness z/c of the section at x/c, never negative.
 * @example heightAt(readSection({ flat: 3 }, 100), 0.3) // → 0.03
 */
export function heightAt(section: Section, x: number): number {
  return Math.max(0, ordinateAt(section, 'upper', x) - ordinateAt(section, 'lower', x));
}
