import { distanceTo } from './contour.ts';
import type { Point, Shape } from './shape.ts';

/** A place that the pointer fell onto: a corner of something drawn, a line of it, or nothing. */
export interface Snapped {
  at: Point;
  onto: 'corner' | 'line' | null;
}

/**
 * The corner within `reach` of a point that is nearest to it; without one the nearest place on a line within half of
 * that; else the point itself. All mm.
 */
export function snapPoint(
  shapes: readonly Pick<Shape, 'points' | 'closed'>[],
  at: Point,
  reach: number,
): Snapped {
  let corner: Point | null = null;
  let line: Point | null = null;
  let [nearestCorner, nearestLine] = [reach, reach / 2];
  for (const { points, closed } of shapes) {
    for (const [i, p] of points.entries()) {
      const far = Math.hypot(p[0] - at[0], p[1] - at[1]);
      if (far <= nearestCorner) [corner, nearestCorner] = [p, far];
      const before = points[i - 1] ?? (closed ? points.at(-1) : undefined);
      if (!before || isBeyond(at, before, p, nearestLine)) continue;
      const beside = distanceTo(at, before, p);
      if (beside <= nearestLine) [line, nearestLine] = [footOn(at, before, p), beside];
    }
  }
  if (corner) return { at: corner, onto: 'corner' };
  return line ? { at: line, onto: 'line' } : { at, onto: null };
}

function isBeyond([x, y]: Point, [ax, ay]: Point, [bx, by]: Point, reach: number): boolean {
  return (
    Math.min(ax, bx) - x > reach ||
    x - Math.max(ax, bx) > reach ||
    Math.min(ay, by) - y > reach ||
    y - Math.max(ay, by) > reach
  );
}

/** The place nearest to a point on the stretch between two others. */
function footOn(p: Point, a: Point, b: Point): Point {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const square = dx * dx + dy * dy;
  const share = square > 0 ? ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / square : 0;
  const f = Math.min(1, Math.max(0, share));
  return [a[0] + f * dx, a[1] + f * dy];
}

/**
 * A length in steps of a unit, or the nearest of some marks where one lies within `reach` of it.
 * @example snapLength(41.7, 1, [42.5], 1) // → 42.5
 * @example snapLength(44.7, 1, [42.5], 1) // → 45
 */
export function snapLength(value: number, step: number, marks: readonly number[] = [], reach = 0): number {
  let mark: number | null = null;
  for (const candidate of marks) {
    const far = Math.abs(candidate - value);
    if (far <= reach && (mark === null || far < Math.abs(mark - value))) mark = candidate;
  }
  // Tenths of a micrometre: what counting steps leaves over.
  return mark ?? Math.round(Math.round(value / step) * step * 1e4) / 1e4;
}
