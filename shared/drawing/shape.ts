import type { MaterialCategory, Plan } from '#shared/core/plan.ts';

/**
 * What the drawings are made of: closed or open lines in mm, each with the line of the balance sheet that it
 * belongs to. Views differ only in what the two numbers of a point mean; each view says so.
 */
export type Point = readonly [number, number];

export type ShapeKind =
  | 'outline'
  | 'joint'
  | 'ribs'
  | 'strip'
  /** a nose or tail strip as bought, before it is sanded to the section */
  | 'stock'
  | 'notch'
  | 'lightening'
  | 'skin'
  | 'capStrips'
  | 'web'
  | 'tipBlock'
  | 'sheet'
  | 'covering'
  | 'finish'
  | 'bar'
  | 'plate'
  | 'item';

/** What a shape is hatched by. */
export interface ShapeMaterial {
  category: MaterialCategory;
  /** kg/m³ */
  density: number | undefined;
}

export interface Shape {
  kind: ShapeKind;
  /** id of its line, such as `wing/spar-top`; null where it belongs to no single one */
  line: string | null;
  points: Point[];
  /** bore of a tube */
  hole?: Point[];
  /** false: a line, not an area */
  closed: boolean;
  /** null: drawn by its line only */
  material: ShapeMaterial | null;
  /** lies under or behind something: a dashed line */
  hidden: boolean;
}

export function shapeMaterial(materials: Plan['materials'], key: string): ShapeMaterial | null {
  const material = materials[key];
  return material ? { category: material.category, density: material.density } : null;
}

/** Width of what is drawn, or null where nothing is. */
export interface Bounds {
  min: Point;
  max: Point;
}

export function boundsOf(shapes: readonly Pick<Shape, 'points'>[]): Bounds | null {
  let [x0, y0, x1, y1] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { points } of shapes) {
    for (const [x, y] of points) {
      x0 = Math.min(x0, x);
      y0 = Math.min(y0, y);
      x1 = Math.max(x1, x);
      y1 = Math.max(y1, y);
    }
  }
  return x0 > x1 ? null : { min: [x0, y0], max: [x1, y1] };
}

/** Corners of a circle or ellipse about a centre. */
export function ellipse(centre: Point, rx: number, ry = rx, corners = 32): Point[] {
  return Array.from({ length: corners }, (_, i): Point => {
    const angle = (2 * Math.PI * i) / corners;
    return [centre[0] + rx * Math.cos(angle), centre[1] + ry * Math.sin(angle)];
  });
}
