import type { Plan } from '#shared/core/plan.ts';
import { sidesOf, type SideName } from './frames.ts';
import type { Shape } from './shape.ts';
import { itemShape, solidShapes, type ModelView } from './solid-shapes.ts';
import { surfaceShapes } from './surface-view.ts';

interface PlanViewOptions {
  /** `starboard`: only the starboard half of each mirrored surface */
  half?: 'both' | 'starboard';
}

/** The whole model from above in body axes, mm: x aft, y to starboard. Lowest first. */
export function planView(plan: Plan, { half = 'both' }: PlanViewOptions = {}): Shape[] {
  return modelShapes(plan, 'above', half === 'both' ? undefined : ['starboard']);
}

/** The whole model from its port side in body axes, mm: x aft, z up. Lowest first. */
export function sideView(plan: Plan): Shape[] {
  return modelShapes(plan, 'side', ['starboard']);
}

/** The whole model from ahead, mm: −y, so that starboard lies to the left, and z up. Lowest first. */
export function frontView(plan: Plan): Shape[] {
  return modelShapes(plan, 'front', undefined);
}

/** Solids lie under the surfaces from above and over them from the side; items lie on top of all. */
function modelShapes(plan: Plan, view: ModelView, sides: readonly SideName[] | undefined): Shape[] {
  const surfaces = plan.surfaces.flatMap((surface) =>
    surfaceShapes(surface, plan.materials, view, sides ?? sidesOf(surface)),
  );
  const solids = plan.solids.flatMap((solid) => solidShapes(solid, plan.materials, view));
  const items = plan.items.map((item) => itemShape(item, view));
  return view === 'above' ? [...solids, ...surfaces, ...items] : [...surfaces, ...solids, ...items];
}
