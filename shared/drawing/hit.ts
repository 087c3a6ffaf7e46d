import { polygonIntegrals } from '#shared/core/polygon.ts';
import { distanceTo } from './contour.ts';
import { boundsOf, type Bounds, type Point, type Shape } from './shape.ts';

/** A shape made ready for being pointed at. */
export interface Target {
  line: string;
  points: Point[];
  closed: boolean;
  bounds: Bounds;
  area: number;
}

/** What can be pointed at: shapes that belong to a line and are drawn as such. */
export function targetsOf(shapes: readonly Shape[]): Target[] {
  return shapes.flatMap(({ kind, line, points, closed }) => {
    const bounds = boundsOf([{ points }]);
    if (line === null || !bounds || kind === 'covering' || kind === 'finish') return [];
    return [{ line, points, closed, bounds, area: closed ? polygonIntegrals(points).area : 0 }];
  });
}

/**
 * Line of the smallest shape within `reach` of a point, so that a spar is found before the sheeting that it lies
 * under; null where nothing is near.
 */
export function lineAt(targets: readonly Target[], at: Point, reach: number): string | null {
  let found: Target | null = null;
  for (const target of targets) {
    if (found && target.area >= found.area) continue;
    if (isNear(target, at, reach)) found = target;
  }
  return found?.line ?? null;
}

function isNear({ points, closed, bounds: { min, max } }: Target, at: Point, reach: number): boolean {
  if (at[0] < min[0] - reach || at[0] > max[0] + reach || at[1] < min[1] - reach || at[1] > max[1] + reach) {
    return false;
  }
  if (closed && holds(points, at)) return true;
  return points.some((p, i) => {
    const before = points[i - 1] ?? (closed ? points.at(-1) : undefined);
    return before !== undefined && distanceTo(at, before, p) <= reach;
  });
}

/** Even–odd rule. */
function holds(points: readonly Point[], [x, y]: Point): boolean {
  let inside = false;
  points.forEach((p, i) => {
    const q = points[(i + 1) % points.length] ?? p;
    if (p[1] > y !== q[1] > y && x < p[0] + ((q[0] - p[0]) * (y - p[1])) / (q[1] - p[1])) inside = !inside;
  });
  return inside;
}
