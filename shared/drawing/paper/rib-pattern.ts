import { facesOf } from '#shared/core/faces.ts';
import { stripZ } from '#shared/core/fit.ts';
import { covers, ribExtent, stripAt, type Half } from '#shared/core/half.ts';
import { polygonIntegrals } from '#shared/core/polygon.ts';
import type { FaceName } from '#shared/core/section-running.ts';
import type { Station } from '#shared/core/stations.ts';
import { faceLine, offsetLeft, sliceOf } from '../contour.ts';
import { rectangle, stripSection } from '../section-strips.ts';
import type { Point } from '../shape.ts';
import { clippedAlong, notched } from './notch.ts';

/** A rib as it is cut from sheet: x mm aft of the leading edge, z up. */
export interface RibPattern {
  s: number;
  chord: number;
  /** less skins, cap strips and notches, between nose and tail strip */
  outline: Point[];
  /** for what runs through its middle */
  holes: Point[][];
  /** roughly what lightening takes out; where there is none, empty */
  lightening: Point[];
}

/** The pattern of a rib at a station, `lightening` being the share that is taken out; null where nothing is left. */
export function ribPattern(half: Half, station: Station, lightening: number): RibPattern | null {
  const { chord, s } = station;
  const [from, to] = ribExtent(half, station);
  if (chord <= 0 || to <= from) return null;
  let { upper, lower } = faceChains(half, station, from, to);
  const holes: Point[][] = [];
  for (const strip of half.strips) {
    if (!strip.letIn || strip.seat === 'nose' || strip.seat === 'tail' || !covers(strip, s)) continue;
    const place = stripAt(strip, station);
    const z = stripZ(half, strip, station, place);
    const { front, back, height } = place;
    if (strip.seat === 'top') upper = notched(upper, front, back, z - height / 2);
    else if (strip.seat === 'bottom') lower = notched(lower, front, back, z + height / 2);
    else if (strip.profile === 'rectangle' || strip.profile === 'triangle') {
      holes.push(rectangle(front, back, z - height / 2, z + height / 2));
    } else holes.push(stripSection(half, strip, station).points);
  }
  const outline = clippedAlong([...upper, ...lower], from * chord, to * chord);
  return { s, chord, outline, holes, lightening: lighteningOf(station, from, to, lightening) };
}

interface Stretch {
  points: Point[];
  depth: number;
}

/** Both faces under what covers them: the upper from the back to the nose, the lower from there to the back. */
function faceChains(
  half: Half,
  station: Station,
  from: number,
  to: number,
): { upper: Point[]; lower: Point[] } {
  const upper = stretchesOf(half, station, 'upper', from, to)
    .map(({ points, depth }) => ({ points: points.reverse(), depth }))
    .reverse();
  const lower = stretchesOf(half, station, 'lower', from, to);
  const [ahead, below] = [upper.at(-1), lower[0]];
  const chain = (list: readonly Stretch[]) => list.flatMap(({ points, depth }) => offsetLeft(points, depth));
  if (from > 0 || !ahead || !below || ahead.depth !== below.depth) {
    return { upper: chain(upper), lower: chain(lower) };
  }
  // What is covered alike on both sides of the nose goes round it in one.
  const nose = offsetLeft([...ahead.points, ...below.points], ahead.depth);
  const first = nose.reduce((best, p, i) => (p[0] < (nose[best]?.[0] ?? Infinity) ? i : best), 0);
  return {
    upper: [...chain(upper.slice(0, -1)), ...nose.slice(0, first + 1)],
    lower: [...nose.slice(first + 1), ...chain(lower.slice(1))],
  };
}

/** A face from front to back in stretches that are covered evenly. */
function stretchesOf(half: Half, station: Station, face: FaceName, from: number, to: number): Stretch[] {
  const over = [...half.skins, ...half.caps].flatMap((cover) =>
    covers(cover, station.s)
      ? facesOf(cover).flatMap((range) =>
          range.face === face ? [{ ...range, thickness: cover.thickness }] : [],
        )
      : [],
  );
  const edges = [from, ...over.flatMap((range) => [range.from, range.to]), to]
    .filter((x) => x >= from && x <= to)
    .sort((a, b) => a - b);
  const stretches: Stretch[] = [];
  for (const [i, end] of edges.entries()) {
    const begin = edges[i - 1];
    if (begin === undefined || end - begin < 1e-9) continue;
    const middle = (begin + end) / 2;
    const depth = over
      .filter((range) => range.from <= middle && range.to >= middle)
      .reduce((sum, { thickness }) => sum + thickness, 0);
    const points = faceLine(station, face, begin, end);
    const last = stretches.at(-1);
    if (last?.depth === depth) last.points.push(...points.slice(1));
    else stretches.push({ points, depth });
  }
  return stretches;
}

/** The rib shrunk about its centroid until what is inside is the share taken out. */
function lighteningOf(station: Station, from: number, to: number, share: number): Point[] {
  const slice = sliceOf(station, from, to);
  const { centroid } = polygonIntegrals(slice);
  if (share <= 0 || !centroid) return [];
  const size = Math.sqrt(share);
  return slice.map(([x, z]): Point => [
    centroid[0] + size * (x - centroid[0]),
    centroid[1] + size * (z - centroid[1]),
  ]);
}
