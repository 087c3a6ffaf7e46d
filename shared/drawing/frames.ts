import type { Surface } from '#shared/core/plan.ts';
import { pointOf, type Station, type SurfaceLine } from '#shared/core/stations.ts';
import type { Point } from './shape.ts';

/**
 * How a point of a surface is seen. `above`: x aft, y to starboard. `side`: x aft, z up. `front`: from ahead, −y, so
 * that starboard lies to the left, and z up. `board`: x aft, s along the panels as they are laid on the board, so
 * that nothing is foreshortened. The port half has −y and −s.
 */
export type FrameName = 'above' | 'side' | 'front' | 'board';
export type SideName = 'starboard' | 'port';

/**
 * Where a point lies in the view: `x` mm behind the station's leading edge, `z` above its chord line, and `beyond`
 * mm farther along the panel.
 */
export type Frame = (station: Station, x: number, z?: number, beyond?: number) => Point;

export function frameOf(name: FrameName, side: SideName = 'starboard'): Frame {
  const sign = side === 'port' ? -1 : 1;
  switch (name) {
    case 'above':
      return (station, x, z = 0, beyond = 0) => {
        const [bodyX, y] = pointOf(station, x, z);
        return [bodyX, sign * (y + beyond * station.panel.cos)];
      };
    case 'side':
      return (station, x, z = 0, beyond = 0) => {
        const [bodyX, , bodyZ] = pointOf(station, x, z);
        return [bodyX, bodyZ + beyond * station.panel.sin];
      };
    case 'front':
      return (station, x, z = 0, beyond = 0) => {
        const [, y, bodyZ] = pointOf(station, x, z);
        return [-sign * (y + beyond * station.panel.cos), bodyZ + beyond * station.panel.sin];
      };
    case 'board':
      return (station, x, _z, beyond = 0) => [station.leadingEdge + x, sign * (station.s + beyond)];
  }
}

/** Least foreshortening at which a surface's parts are still worth drawing. */
const EDGE_ON = 0.3;

/**
 * True where a view meets a surface so flatly that only its sections are to be seen, as a fin from above. From ahead
 * every surface is seen by its thickness.
 */
export function isEdgeOn(name: FrameName, line: SurfaceLine): boolean {
  if (name === 'board' || name === 'front' || line.length <= 0) return false;
  const seen = line.panels.reduce(
    (sum, panel) => sum + (panel.end - panel.start) * Math.abs(name === 'above' ? panel.cos : panel.sin),
    0,
  );
  return seen / line.length < EDGE_ON;
}

/** The halves that a surface has. */
export function sidesOf(surface: Pick<Surface, 'mirrored'>): SideName[] {
  return surface.mirrored ? ['starboard', 'port'] : ['starboard'];
}
