import { LIMITS } from '#shared/schemas/limits.ts';
import { coordinatesIn, type Coordinate } from './coordinate-lines.ts';
import { checkOrder, chordOf, facesIn, type Faces } from './faces.ts';
import { SectionRefused, type SectionNote, type SectionProblem } from './findings.ts';
import { thinnedTo } from './thin.ts';

/** A section as it was read: points of unit chord round from the trailing edge over the top. */
export interface ReadSection {
  /** what the text calls it; null where it does not */
  name: string | null;
  points: [number, number][];
  layout: Faces['layout'];
  notes: SectionNote[];
}

export type SectionReading = { section: ReadSection } | { problem: SectionProblem };

/** A tail so near to 1 or to 100, as a share of that, is meant to lie there. */
const NEARLY = 0.005;
/** How far from nose and tail a face may begin and end, and how far noses may lie apart, shares of the chord. */
const SHORT = 0.05;
const NOSE_GAP = 0.05;
const NOSE_JOINED = 1e-4;
/** The thickest thing that anybody has called a section. */
const FAR_OFF = 1;

type Pair = [number, number];

/**
 * Reads a section's coordinates from a text, in any of the layouts that are about, in shares or per cent of the chord
 * or at any size, with point or comma; tells what was mended, or why, and in which line, it is refused.
 */
export function readSectionText(text: string): SectionReading {
  try {
    return { section: read(text) };
  } catch (error) {
    if (error instanceof SectionRefused) return { problem: error.problem };
    throw error;
  }
}

function read(text: string): ReadSection {
  const { title, blocks } = coordinatesIn(text);
  const notes: SectionNote[] = [];
  const found = blocks.reduce((sum, block) => sum + block.length, 0);
  if (found < LIMITS.sectionPoints.min) throw new SectionRefused({ code: 'no_points', found });
  const { first, second, layout } = facesIn({ blocks });
  const all = [...first, ...second];
  const chord = chordOf(all);
  const line = all[0]?.line ?? 1;
  if (!(chord > 0)) throw new SectionRefused({ code: 'no_chord', line });
  if (first.length < 2 || second.length < 2) throw new SectionRefused({ code: 'one_face', line });
  checkOrder(first, 'first', chord);
  checkOrder(second, 'second', chord);
  const unit = toUnit(all, chord, notes);
  checkReach(first, 'first', unit);
  checkReach(second, 'second', unit);
  const faces = [first, second].map((face) => face.map((point): Pair => unit(point)));
  const bare = faces.map(withoutDoubles);
  const doubles = faces.reduce((sum, face, i) => sum + face.length - (bare[i]?.length ?? 0), 0);
  if (doubles > 0) notes.push({ code: 'duplicates', count: doubles });
  const [one = [], other = []] = bare;
  const [upper, lower] = meanZ(one) >= meanZ(other) ? [one, other] : [other, one];
  if (upper !== one) notes.push({ code: 'turned' });
  const nose = noseBetween(upper, lower, second[0]?.line ?? line, notes);
  const [top = upper, bottom = lower] = thinned([[...nose, ...upper], lower], notes);
  const points = [...[...top].reverse(), ...(same(top[0], bottom[0]) ? bottom.slice(1) : bottom)];
  if (points.length < LIMITS.sectionPoints.min) {
    throw new SectionRefused({ code: 'no_points', found: points.length });
  }
  return { name: title?.slice(0, LIMITS.name.max) ?? null, points, layout, notes };
}

/** How a point is brought to a chord of 1 from the nose; one that then lies far off is refused. */
function toUnit(
  all: readonly Coordinate[],
  chord: number,
  notes: SectionNote[],
): (point: Coordinate) => Pair {
  const nose = all.reduce((least, { x }) => Math.min(least, x), Infinity);
  const ends = (at: number) => Math.abs(nose + chord - at) <= NEARLY * at && Math.abs(nose) <= SHORT * at;
  const [from, by] = ends(1) ? [0, 1] : ends(100) ? [0, 100] : [nose, chord];
  if (by === 100) notes.push({ code: 'percent' });
  else if (by !== 1) notes.push({ code: 'scaled', chord });
  const unit = ({ x, z }: Coordinate): Pair => [(x - from) / by, z / by];
  for (const point of all) {
    const { line, text } = point;
    if (Math.abs(unit(point)[1]) > FAR_OFF) throw new SectionRefused({ code: 'far_off', line, text });
  }
  return unit;
}

function checkReach(
  face: readonly Coordinate[],
  name: 'first' | 'second',
  unit: (p: Coordinate) => Pair,
): void {
  const [nose, tail] = [face[0], face.at(-1)];
  if (nose && unit(nose)[0] > SHORT) {
    throw new SectionRefused({ code: 'short_face', line: nose.line, face: name, end: 'nose' });
  }
  if (tail && unit(tail)[0] < 1 - SHORT) {
    throw new SectionRefused({ code: 'short_face', line: tail.line, face: name, end: 'tail' });
  }
}

const same = (a: Pair | undefined, b: Pair | undefined) =>
  a !== undefined && b !== undefined && Math.abs(a[0] - b[0]) < 1e-9 && Math.abs(a[1] - b[1]) < 1e-9;

const withoutDoubles = (face: Pair[]): Pair[] =>
  face.filter((point, i) => i === 0 || !same(point, face[i - 1]));

/** Mean height of a face along the chord, which tells the upper from the lower. */
function meanZ(face: readonly Pair[]): number {
  let [area, length] = [0, 0];
  for (const [i, [x, z]] of face.entries()) {
    const before = face[i - 1];
    if (!before) continue;
    area += ((z + before[1]) / 2) * (x - before[0]);
    length += x - before[0];
  }
  return length > 0 ? area / length : 0;
}

/**
 * What is missing of the nose: nothing where one face reaches the leading edge, for the other is then joined straight
 * to it; else a point on the leading edge, midway between the two.
 */
function noseBetween(
  upper: readonly Pair[],
  lower: readonly Pair[],
  line: number,
  notes: SectionNote[],
): Pair[] {
  const [a, b] = [upper[0], lower[0]];
  if (!a || !b) return [];
  const gap = Math.hypot(a[0] - b[0], a[1] - b[1]);
  if (gap > NOSE_GAP) throw new SectionRefused({ code: 'nose_open', line, gap });
  const reached = Math.min(a[0], b[0]) <= NOSE_JOINED;
  if (gap > NOSE_JOINED || !reached) notes.push({ code: 'nose_joined', gap });
  return reached ? [] : [[0, (a[1] + b[1]) / 2]];
}

function thinned(faces: readonly (readonly Pair[])[], notes: SectionNote[]): Pair[][] {
  const from = faces.reduce((sum, face) => sum + face.length, 0);
  const most = LIMITS.sectionPoints.max;
  if (from <= most) return faces.map((face) => [...face]);
  const { lines, tolerance } = thinnedTo(faces, most);
  notes.push({ code: 'thinned', from, to: lines.reduce((sum, line) => sum + line.length, 0), tolerance });
  return lines;
}
