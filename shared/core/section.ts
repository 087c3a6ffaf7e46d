import { nacaNoseArc, nacaOrdinate } from './naca.ts';
import type { PointsSpec, SectionSpec } from './plan.ts';

/**
 * A section as the core reads it: upper and lower z/c at equal x/c, so that any two can be blended ordinate by
 * ordinate. Every second node is the middle of its neighbours' interval (in the angle that crowds nodes at nose
 * and tail), which lets integrals be extrapolated from two step widths.
 */
export interface Section {
  /** x/c from 0 at the nose to 1 at the tail; an odd number of nodes */
  x: Float64Array;
  upper: Float64Array;
  lower: Float64Array;
  /** developed length in front of x = 0 that belongs to the upper face, of the chord: a cambered section's nose */
  noseOnTop: number;
  /** upright face at x = 0 that only a skin round the nose covers; 0 for a plate, whose edges carry no skin */
  noseFace: number;
}

const BASE_INTERVALS = 96;

/** x/c of an angle from the nose; equal steps of it crowd the nodes where a section turns. */
const xOfAngle = (angle: number) => (1 - Math.cos(angle)) / 2;
const angleOfX = (x: number) => Math.acos(1 - 2 * Math.min(1, Math.max(0, x)));

/**
 * Nodes, x/c from 0 to 1, for sections that must share them: the base grid, the given kinks (corners of a polygon
 * section, places where a curve's formula changes), and the middles between. Always an odd number of them.
 * @example sectionGrid().length // → 193
 */
export function sectionGrid(kinks: readonly number[] = []): Float64Array {
  const angles = Array.from({ length: BASE_INTERVALS + 1 }, (_, i) => (i * Math.PI) / BASE_INTERVALS);
  for (const x of kinks) if (x > 0 && x < 1) angles.push(angleOfX(x));
  angles.sort((a, b) => a - b);
  const distinct = angles.filter((a, i) => i === 0 || a - (angles[i - 1] ?? 0) > 1e-9);
  const x = new Float64Array(2 * distinct.length - 1);
  distinct.forEach((angle, i) => {
    x[2 * i] = xOfAngle(angle);
    const next = distinct[i + 1];
    if (next !== undefined) x[2 * i + 1] = xOfAngle((angle + next) / 2);
  });
  x[x.length - 1] = 1;
  return x;
}

/** Upper and lower face of a coordinate section, each from nose to tail. */
function facesOf(spec: PointsSpec): { upper: [number, number][]; lower: [number, number][] } {
  let nose = 0;
  spec.points.forEach((p, i) => {
    if (p[0] < (spec.points[nose]?.[0] ?? Infinity)) nose = i;
  });
  const noseX = spec.points[nose]?.[0];
  const second = spec.points[nose + 1]?.[0] === noseX ? nose + 1 : nose;
  return { upper: spec.points.slice(0, nose + 1).reverse(), lower: spec.points.slice(second) };
}

/**
 * x/c where a section's ordinates have corners, so that a shared grid has nodes there: the points of a coordinate
 * section, the place of greatest camber of a four-digit one.
 * @example kinksOf({ naca: '4409' }) // → [0.4]
 */
export function kinksOf(spec: SectionSpec): number[] {
  if ('points' in spec) return spec.points.map((p) => p[0]);
  if ('naca' in spec) return [Number(spec.naca[1]) / 10];
  return [];
}

/** z on a face at x by straight lines between its points; ends hold beyond the first and last point. */
function interpolate(face: readonly [number, number][], x: number): number {
  let previous = face[0] ?? [0, 0];
  for (const point of face) {
    if (point[0] >= x) {
      const run = point[0] - previous[0];
      return run <= 0 ? point[1] : previous[1] + ((point[1] - previous[1]) * (x - previous[0])) / run;
    }
    if (point[0] >= previous[0]) previous = point;
  }
  return previous[1];
}

/**
 * Reads a section on a grid of x/c, by default its own. A plate of constant thickness depends on the chord (mm)
 * that it is read at; other sections do not.
 * @example readSection({ flat: 3 }, 100).upper[0] // → 0.015
 * @example readSection({ naca: '0012' }, 100).noseOnTop // → 0
 */
export function readSection(
  spec: SectionSpec,
  chord: number,
  x: Float64Array = sectionGrid(kinksOf(spec)),
): Section {
  if ('flat' in spec) {
    const half = chord > 0 ? spec.flat / 2 / chord : 0;
    return { x, upper: x.map(() => half), lower: x.map(() => -half), noseOnTop: 0, noseFace: 0 };
  }
  if ('naca' in spec) {
    const upper = x.map((v) => nacaOrdinate(spec.naca, v, 1));
    const lower = x.map((v) => nacaOrdinate(spec.naca, v, -1));
    return { x, upper, lower, noseOnTop: nacaNoseArc(spec.naca), noseFace: 0 };
  }
  const faces = facesOf(spec);
  const upper = x.map((v) => interpolate(faces.upper, v));
  const lower = x.map((v) => interpolate(faces.lower, v));
  return { x, upper, lower, noseOnTop: 0, noseFace: Math.abs((upper[0] ?? 0) - (lower[0] ?? 0)) };
}

/** A section and its partner at a panel's other end, on one grid. */
export interface SectionPair {
  root: (chord: number) => Section;
  tip: (chord: number) => Section;
}

/**
 * Formula sections already read, by their digits: reading one solves a root at each of 200 nodes, and the same few
 * come back with every key stroke. A memory of pure answers only, kept small.
 */
const alreadyRead = new Map<string, SectionPair>();
const REMEMBERED = 64;

/**
 * Both sections of a panel on the grid that they share, as functions of the chord in mm. Sections that are alike
 * come back as one and the same function.
 * @example readPair({ flat: 3 }, { naca: '0012' }).root(100).upper[0] // → 0.015
 */
export function readPair(rootSpec: SectionSpec, tipSpec: SectionSpec): SectionPair {
  const key = 'points' in rootSpec || 'points' in tipSpec ? null : JSON.stringify([rootSpec, tipSpec]);
  const known = key === null ? undefined : alreadyRead.get(key);
  if (known) return known;
  const grid = sectionGrid([...kinksOf(rootSpec), ...kinksOf(tipSpec)]);
  const root = readerOf(rootSpec, grid);
  const same = rootSpec === tipSpec || JSON.stringify(rootSpec) === JSON.stringify(tipSpec);
  const pair = { root, tip: same ? root : readerOf(tipSpec, grid) };
  if (key !== null) {
    if (alreadyRead.size >= REMEMBERED) alreadyRead.clear();
    alreadyRead.set(key, pair);
  }
  return pair;
}

/** A plate is read anew at each chord; any other section once. */
function readerOf(spec: SectionSpec, grid: Float64Array): (chord: number) => Section {
  if ('flat' in spec) return (chord) => readSection(spec, chord, grid);
  const once = readSection(spec, 1, grid);
  return () => once;
}

/**
 * Blend of two sections on one grid, ordinate by ordinate: `share` 0 gives the first, 1 the second.
 * @example blendSections(readSection({ flat: 2 }, 100), readSection({ flat: 4 }, 100), 0.5).upper[0] // → 0.015
 */
export function blendSections(a: Section, b: Section, share: number): Section {
  if (a === b || share === 0) return a;
  if (share === 1) return b;
  return {
    x: a.x,
    upper: mix(a.upper, b.upper, share),
    lower: mix(a.lower, b.lower, share),
    noseOnTop: a.noseOnTop + share * (b.noseOnTop - a.noseOnTop),
    noseFace: a.noseFace + share * (b.noseFace - a.noseFace),
  };
}

function mix(p: Float64Array, q: Float64Array, share: number): Float64Array {
  const mixed = new Float64Array(p.length);
  for (let i = 0; i < p.length; i++) mixed[i] = (p[i] ?? 0) + share * ((q[i] ?? 0) - (p[i] ?? 0));
  return mixed;
}

/**
 * First x/c of the grid at which the upper face lies below the lower, or null. At the very ends it does not count.
 * @example selfCrossingAt(readSection({ naca: '0012' }, 100)) // → null
 */
export function selfCrossingAt(section: Section): number | null {
  const at = section.x.findIndex(
    (x, i) => x > 0.001 && x < 0.999 && (section.upper[i] ?? 0) < (section.lower[i] ?? 0) - 1e-9,
  );
  return at < 0 ? null : (section.x[at] ?? null);
}
