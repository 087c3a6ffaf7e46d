import type { Point } from '../shape.ts';

/** Where the stretch between two points meets an x. */
function meeting([ax, az]: Point, [bx, bz]: Point, x: number): Point {
  return [x, bx === ax ? bz : az + ((bz - az) * (x - ax)) / (bx - ax)];
}

/**
 * A line along a face with a notch cut into it between two x, down (or up) to `floor`. The line may run either way;
 * where it begins or ends inside the notch it begins or ends on its floor.
 */
export function notched(line: readonly Point[], front: number, back: number, floor: number): Point[] {
  const inside = ([x]: Point) => x > front && x < back;
  const cut: Point[] = [];
  let before: Point | null = null;
  for (const point of line) {
    if (before) cut.push(...between(before, point, front, back, floor));
    else if (inside(point)) cut.push([point[0], floor]);
    if (!inside(point)) cut.push(point);
    before = point;
  }
  if (before && inside(before)) cut.push([before[0], floor]);
  return cut;
}

/** Corners that a notch adds on the way from one point to the next. */
function between(from: Point, to: Point, front: number, back: number, floor: number): Point[] {
  const forward = to[0] > from[0];
  const [enter, leave] = forward ? [front, back] : [back, front];
  const reaches = (edge: number) =>
    forward ? from[0] <= edge && edge < to[0] : from[0] >= edge && edge > to[0];
  const passes = (edge: number) =>
    forward ? from[0] < edge && edge <= to[0] : from[0] > edge && edge >= to[0];
  return [
    ...(reaches(enter) ? [meeting(from, to, enter), [enter, floor] as const] : []),
    ...(passes(leave) ? [[leave, floor] as const, meeting(from, to, leave)] : []),
  ];
}

/** A polygon between two x: what lies beyond is cut off square. */
export function clippedAlong(polygon: readonly Point[], from: number, to: number): Point[] {
  const cut = (points: readonly Point[], edge: number, keep: (x: number) => boolean) =>
    points.flatMap((point, i): Point[] => {
      const before = points[i - 1] ?? points.at(-1) ?? point;
      const crossing = keep(point[0]) !== keep(before[0]) ? [meeting(before, point, edge)] : [];
      return keep(point[0]) ? [...crossing, point] : crossing;
    });
  return cut(
    cut(polygon, from, (x) => x >= from),
    to,
    (x) => x <= to,
  );
}
