import type { Plan, Surface } from '#shared/core/plan.ts';
import type { FrameName, SideName } from '#shared/drawing/frames.ts';
import { sidesOf } from '#shared/drawing/frames.ts';
import type { Shape } from '#shared/drawing/shape.ts';
import { itemShape, solidShapes, type ModelView } from '#shared/drawing/solid-shapes.ts';
import { surfaceShapes } from '#shared/drawing/surface-view.ts';

/** One surface's half laid flat, or the whole model from above, from the side or from ahead. */
export type PlanViewName = 'half' | 'whole' | 'side' | 'front';

/** A layer of the drawing that is drawn anew only when what it shows was changed. */
export interface Layer {
  key: string;
  shapes: readonly Shape[];
}

interface Drawn {
  materials: Plan['materials'];
  sides: string;
  shapes: Shape[];
}

/** Surfaces that an edit left alone are the same objects as before, and so are their shapes. */
const drawnBefore: Record<FrameName, WeakMap<Surface, Drawn>> = {
  above: new WeakMap(),
  side: new WeakMap(),
  front: new WeakMap(),
  board: new WeakMap(),
};

function shapesOf(
  surface: Surface,
  materials: Plan['materials'],
  frame: FrameName,
  sides: readonly SideName[],
): Shape[] {
  const known = drawnBefore[frame].get(surface);
  const wanted = sides.join();
  if (known?.materials === materials && known.sides === wanted) return known.shapes;
  const shapes = surfaceShapes(surface, materials, frame, sides);
  drawnBefore[frame].set(surface, { materials, sides: wanted, shapes });
  return shapes;
}

/** One half of a surface, laid flat on the board. */
export function halfLayers(surface: Surface, materials: Plan['materials'], side: SideName): Layer[] {
  return [{ key: surface.key, shapes: shapesOf(surface, materials, 'board', [side]) }];
}

/** The whole model. Solids lie under the surfaces from above and over them from the side and from ahead. */
export function modelLayers(plan: Plan, view: ModelView): Layer[] {
  const { materials } = plan;
  const surfaces = plan.surfaces.map((surface): Layer => {
    const sides = view === 'side' ? (['starboard'] as const) : sidesOf(surface);
    return { key: surface.key, shapes: shapesOf(surface, materials, view, sides) };
  });
  const solids: Layer = {
    key: 'solids ',
    shapes: plan.solids.flatMap((solid) => solidShapes(solid, materials, view)),
  };
  const items: Layer = { key: 'items ', shapes: plan.items.map((item) => itemShape(item, view)) };
  return view === 'above' ? [solids, ...surfaces, items] : [...surfaces, solids, items];
}
