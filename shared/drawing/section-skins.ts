import { facesOf } from '#shared/core/faces.ts';
import { covers, type Half } from '#shared/core/half.ts';
import type { CapStrips, Covering, Skin } from '#shared/core/plan.ts';
import type { Station } from '#shared/core/stations.ts';
import { faceLine, offsetLeft } from './contour.ts';
import type { Point } from './shape.ts';

/**
 * Lines on the contour that a skin, cap strip or covering follows at a station, each with the wood to its left: from
 * tail to nose on top, from nose to tail below; a wrapped skin is one line round the nose.
 */
export function contourLines(part: Skin | CapStrips | Covering, station: Station): Point[][] {
  const lines = facesOf(part)
    .filter(({ from, to }) => Math.min(1, to) > Math.max(0, from))
    .map(({ face, from, to }) => {
      const line = faceLine(station, face, from, to);
      return face === 'upper' ? line.reverse() : line;
    });
  return part.seat === 'wrap' ? [lines.flat()] : lines;
}

/** A strip of even thickness under such a line, `depth` below it. */
export function bandUnder(line: readonly Point[], depth: number, thickness: number): Point[] {
  return [...offsetLeft(line, depth), ...offsetLeft(line, depth + thickness).reverse()];
}

/** How deep a skin lies under those that come before it over its middle, mm. */
export function depthOf(half: Half, skin: Skin, s: number): number {
  const own = facesOf(skin)[0];
  if (!own) return 0;
  const middle = (own.from + own.to) / 2;
  const before = half.skins.slice(0, half.skins.indexOf(skin));
  return before
    .filter((other) => covers(other, s))
    .filter((other) => facesOf(other).some((f) => f.face === own.face && f.from <= middle && f.to >= middle))
    .reduce((sum, other) => sum + other.thickness, 0);
}
