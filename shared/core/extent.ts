import type { Vec3 } from './frame.ts';
import type { Plan, SurfaceRole } from './plan.ts';
import { surfaceLine } from './stations.ts';

/**
 * The foremost place of a plan, where nose ballast goes: the least x of items, solids and root leading edges.
 * Body axes, mm; null where the plan has nothing.
 * @example noseOf(EXAMPLE_PLAN) // → [-20, 0, 0]
 */
export function noseOf(plan: Pick<Plan, 'items' | 'solids' | 'surfaces'>): Vec3 | null {
  const places: Vec3[] = [
    ...plan.items.map(({ at }) => at),
    ...plan.surfaces.map(({ apex }): Vec3 => [apex[0], 0, apex[2]]),
    ...plan.solids.flatMap((solid): Vec3[] =>
      solid.shape === 'bar' ? [solid.from, solid.to] : solid.outline.map(([x, z]) => [x, solid.y, z]),
    ),
  ];
  return places.reduce<Vec3 | null>((nose, place) => (nose && nose[0] <= place[0] ? nose : place), null);
}

/**
 * Where the outermost panel of a role ends, starboard, at its leading edge: body axes, mm, tip blocks not counted.
 * The widest surface counts; null where there is none.
 * @example tipOf(EXAMPLE_PLAN) // → [0, 500, 0]
 */
export function tipOf(plan: Pick<Plan, 'surfaces'>, role: SurfaceRole = 'wing'): Vec3 | null {
  const tips = plan.surfaces
    .filter((surface) => surface.role === role)
    .flatMap((surface): Vec3[] => {
      const last = surfaceLine(surface).panels.at(-1);
      if (!last) return [];
      const span = last.end - last.start;
      return [[last.leadingEdge[1], last.y + span * last.cos, last.z + span * last.sin]];
    });
  return tips.reduce<Vec3 | null>((out, tip) => (out && out[1] >= tip[1] ? out : tip), null);
}
