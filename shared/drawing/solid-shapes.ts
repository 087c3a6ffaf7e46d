import type { Vec3 } from '#shared/core/frame.ts';
import type { Bar, Item, Plan, Plate, Solid } from '#shared/core/plan.ts';
import type { FrameName } from './frames.ts';
import { ellipse, shapeMaterial, type Point, type Shape } from './shape.ts';

/** Views in which what lies outside a surface is to be seen. */
export type ModelView = Exclude<FrameName, 'board'>;

/** A stick, block or plate from above (x, y), from the side (x, z) or from ahead (−y, z). */
export function solidShapes(solid: Solid, materials: Plan['materials'], view: ModelView): Shape[] {
  const points = solid.shape === 'bar' ? barPoints(solid, view) : platePoints(solid, view);
  const material = shapeMaterial(materials, solid.material);
  return [{ kind: solid.shape, line: `solid/${solid.id}`, points, closed: true, material, hidden: false }];
}

/** Where a point of the body is seen. */
function seen([x, y, z]: Vec3, view: ModelView): Point {
  if (view === 'front') return [-y, z];
  return [x, view === 'above' ? y : z];
}

/** Its true length with its width (from above) or height square to it; end on, its end at its largest. */
function barPoints(bar: Bar, view: ModelView): Point[] {
  const across = view === 'above' ? bar.width : bar.height;
  const [from, to] = [seen(bar.from, view), seen(bar.to, view)];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  if (length < 1e-9) {
    const [high, wide] = [Math.max(...across) / 2, Math.max(...bar.width) / 2];
    const beside = view === 'front' ? wide : high;
    return bar.profile === 'rectangle'
      ? box(from[0] - beside, from[0] + beside, from[1] - high, from[1] + high)
      : ellipse(from, beside, high);
  }
  const normal: Point = [-(to[1] - from[1]) / length, (to[0] - from[0]) / length];
  const beside = (p: Point, by: number): Point => [p[0] + normal[0] * by, p[1] + normal[1] * by];
  return [
    beside(from, across[0] / 2),
    beside(to, across[1] / 2),
    beside(to, -across[1] / 2),
    beside(from, -across[0] / 2),
  ];
}

/** Its outline from the side; else the thickness of all its pieces together, about their plane. */
function platePoints(plate: Plate, view: ModelView): Point[] {
  if (view === 'side') return plate.outline;
  const half = (plate.thickness * plate.count) / 2;
  const along = plate.outline.map(([x, z]) => (view === 'above' ? x : z));
  const [low, high] = [Math.min(...along), Math.max(...along)];
  return view === 'above'
    ? box(low, high, plate.y - half, plate.y + half)
    : box(-plate.y - half, -plate.y + half, low, high);
}

const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

/** Radius, mm, of a ball of about 2 g/cm³, which gear comes near to: a mass of 8 g is drawn 10 mm wide. */
const ballRadius = (grams: number) => 2.5 * Math.cbrt(grams);
const LEAST_RADIUS = 1.5;

/** An item as a ball at its place. */
export function itemShape(item: Item, view: ModelView): Shape {
  const centre = seen(item.at, view);
  const points = ellipse(centre, Math.max(LEAST_RADIUS, ballRadius(item.mass)));
  return { kind: 'item', line: `item/${item.id}`, points, closed: true, material: null, hidden: false };
}
