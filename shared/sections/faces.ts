import type { Coordinate, CoordinateText } from './coordinate-lines.ts';
import { SectionRefused } from './findings.ts';

/** Both faces in the order in which they came, each from nose to tail. */
export interface Faces {
  first: Coordinate[];
  second: Coordinate[];
  /** the faces came one after the other, or the points ran round */
  layout: 'round' | 'faces';
}

/** Within this share of the chord from its ends something is at the nose or at the tail. */
const AT_END = 0.1;
/** A nose may curl back by this share of the chord, within the first of it. */
const CURL = { back: 0.004, within: 0.03 };

const isCount = (value: number) => Number.isInteger(value) && value >= 2;

/**
 * Parts the points of a text into its two faces. Three ways are known: points that run round from the trailing edge
 * to the trailing edge; two faces after a line that says how many points each has; two faces parted by an empty line
 * or one after the other.
 */
export function facesIn({ blocks }: Pick<CoordinateText, 'blocks'>): Faces {
  const counted = countsIn(blocks);
  if (counted) return counted;
  const all = blocks.flat();
  const [one, other] = blocks;
  if (blocks.length === 2 && one && other && one.length > 1 && other.length > 1) {
    return { first: towardsTail(one), second: towardsTail(other), layout: 'faces' };
  }
  const jump = jumpIn(all);
  if (jump !== null) {
    const [first = [], second = []] = [all.slice(0, jump), all.slice(jump)].map(towardsTail);
    return { first, second, layout: 'faces' };
  }
  const nose = all.reduce((best, p, i) => (p.x < (all[best]?.x ?? Infinity) ? i : best), 0);
  return { first: all.slice(0, nose + 1).reverse(), second: all.slice(nose), layout: 'round' };
}

/** Where one face ends and the other begins at the far end of the chord; null where the points run round. */
function jumpIn(all: readonly Coordinate[]): number | null {
  const nose = all.reduce((least, { x }) => Math.min(least, x), Infinity);
  const chord = chordOf(all);
  const share = (i: number) => ((all[i]?.x ?? nose) - nose) / chord;
  for (let i = 2; i <= all.length - 2; i++) {
    const [from, to] = [share(i - 1), share(i)];
    if (Math.min(from, to) < AT_END && Math.max(from, to) > 1 - AT_END) return i;
  }
  return null;
}

/** Faces after a line of two counts; null where the text begins with a point. */
function countsIn(blocks: readonly (readonly Coordinate[])[]): Faces | null {
  const [head, ...points] = blocks.flat();
  if (!head || !isCount(head.x) || !isCount(head.z)) return null;
  const said = head.x + head.z;
  if (said !== points.length) {
    // In per cent the first point may be whole numbers too; what follows counts of points never exceeds a chord of 1.
    if (points.some(({ x }) => Math.abs(x) > 2)) return null;
    throw new SectionRefused({ code: 'counts_differ', line: head.line, said, found: points.length });
  }
  return {
    first: towardsTail(points.slice(0, head.x)),
    second: towardsTail(points.slice(head.x)),
    layout: 'faces',
  };
}

const towardsTail = (face: Coordinate[]): Coordinate[] =>
  (face[0]?.x ?? 0) > (face.at(-1)?.x ?? 0) ? [...face].reverse() : face;

/** Extent along x of some points. */
export function chordOf(points: readonly Pick<Coordinate, 'x'>[]): number {
  let [low, high] = [Infinity, -Infinity];
  for (const { x } of points) {
    low = Math.min(low, x);
    high = Math.max(high, x);
  }
  return high - low;
}

/** Refuses a face that does not run from nose to tail, telling the line at which it turns back. */
export function checkOrder(face: readonly Coordinate[], name: 'first' | 'second', chord: number): void {
  const nose = face[0]?.x ?? 0;
  let reached = -Infinity;
  for (const { x, line, text } of face) {
    const curls = x - nose <= CURL.within * chord && reached - x <= CURL.back * chord;
    if (x < reached && !curls) throw new SectionRefused({ code: 'out_of_order', line, text, face: name });
    reached = Math.max(reached, x);
  }
}
