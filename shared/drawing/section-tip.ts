import { areaBetween } from '#shared/core/section-integrals.ts';
import type { Station } from '#shared/core/stations.ts';
import { contourOf } from './contour.ts';
import type { Point } from './shape.ts';

/** How much of the last section's size is left in a tip block, `beyond` mm outside of it: a half ellipse. */
export function tipShare(beyond: number, length: number): number {
  return length > 0 ? Math.sqrt(Math.max(0, 1 - (beyond / length) ** 2)) : 0;
}

/** The last section shrunk towards its centroid, as a tip block is cut there, mm. */
export function tipContour(last: Station, share: number): Point[] {
  const { amount, x, z } = areaBetween(last.section, 0, 1);
  const centre: Point = amount > 0 ? [(x / amount) * last.chord, (z / amount) * last.chord] : [0, 0];
  return contourOf(last).map(([px, pz]): Point => [
    centre[0] + share * (px - centre[0]),
    centre[1] + share * (pz - centre[1]),
  ]);
}
