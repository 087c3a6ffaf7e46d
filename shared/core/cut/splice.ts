/** A stick that may be longer than any stock. All mm. */
export interface LongStick {
  /** along the stick itself */
  length: number;
  /** across the joint, the way that it is cut slanting */
  thickness: number;
  /** where it begins, from the root of the half */
  from: number;
  /** half span that the inner third is of */
  halfSpan: number;
}

export interface SpliceTerms {
  /** longest stock */
  stock: number;
  /** how flat the scarf is: length over thickness, 8 or more */
  slope: number;
  /**
   * which of the sticks that are spliced alike this one is: top port, bottom port, top starboard, bottom starboard.
   * Each has its joints further in than the one before, so that no two lie at one station.
   */
  turn: 0 | 1 | 2 | 3;
}

/** Scarf joints of a stick: centres from its inner end, and what is cut. */
export interface Splice {
  /** length of a scarf */
  scarf: number;
  joints: number[];
  /** lengths to cut, from the inner end, each with its share of the scarfs */
  pieces: number[];
}

/** Why a stick cannot be spliced: `by` is how much longer the stock would have to be, mm. */
export interface SpliceRefusal {
  refused: 'joint_in_inner_third' | 'stock_shorter_than_scarf';
  by: number;
}

/** The bending of a wing is greatest in there: no joint (common practice, no source). */
const KEPT_CLEAR = 1 / 3;

/**
 * Where a stick that is longer than its stock is spliced: by scarfs of 1 : `slope`, as far out as the stock reaches,
 * none in the inner third of the half span, and by turns two scarfs apart so that top and bottom, port and starboard are
 * not weak at one station. A stick that is short enough has no joint. Slopes of 1 : 8 and flatter are common practice,
 * no source.
 * @example spliceOf({ length: 900, thickness: 3, from: 0, halfSpan: 900 }, { stock: 1000, slope: 8, turn: 0 }) // → { scarf: 24, joints: [], pieces: [900] }
 * @example spliceOf({ length: 1200, thickness: 3, from: 0, halfSpan: 1200 }, { stock: 1000, slope: 8, turn: 0 }) // → { scarf: 24, joints: [988], pieces: [1000, 224] }
 */
export function spliceOf(
  { length, thickness, from, halfSpan }: LongStick,
  { stock, slope, turn }: SpliceTerms,
): Splice | SpliceRefusal {
  const scarf = slope * thickness;
  if (length <= stock) return { scarf, joints: [], pieces: [length] };
  if (stock <= scarf) return { refused: 'stock_shorter_than_scarf', by: scarf - stock };
  const clear = Math.max(0, KEPT_CLEAR * halfSpan - from) + scarf / 2;
  const furthest = stock - scarf / 2;
  if (furthest < clear) return { refused: 'joint_in_inner_third', by: clear - furthest };
  const count = Math.ceil((length - scarf) / (stock - scarf) - 1e-9);
  // Slack that the pieces leave together: so far every joint may come in.
  const slack = count * (stock - scarf) + scarf - length;
  const inward = Math.min(2 * scarf * turn, slack, furthest - clear);
  const joints = Array.from({ length: count - 1 }, (_, i) => furthest + i * (stock - scarf) - inward);
  const ends = [0, ...joints.map((joint) => joint - scarf / 2)];
  const tips = [...joints.map((joint) => joint + scarf / 2), length];
  return { scarf, joints, pieces: ends.map((end, i) => (tips[i] ?? length) - end) };
}

/**
 * The ribs, counted from 1 at the root, that a station lies between; the same rib twice where it lies on one, null
 * where there is none to that side.
 * @example ribsAround([0, 100, 200], 130) // → [2, 3]
 */
export function ribsAround(stations: readonly number[], s: number): [number | null, number | null] {
  const inner = stations.findLastIndex((station) => station <= s);
  const outer = stations.findIndex((station) => station >= s);
  return [inner < 0 ? null : inner + 1, outer < 0 ? null : outer + 1];
}
