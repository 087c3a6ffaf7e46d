import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { demoPlan } from '#tests/support/plans.ts';

/** The largest demo glider with copies of its wing's parts until the plan has so many lines. */
export function planOfParts(count: number): Plan {
  const plan = demoPlan('whimbrel');
  const others =
    plan.surfaces.slice(1).reduce((sum, s) => sum + s.parts.length, 0) +
    plan.items.length +
    plan.solids.length;
  const surfaces = plan.surfaces.map((surface): Surface => {
    if (surface.key !== 'wing') return surface;
    const parts: Part[] = [];
    for (let i = 0; parts.length < count - others; i++) {
      const original = surface.parts[i % surface.parts.length];
      if (!original) break;
      const round = Math.floor(i / surface.parts.length);
      const copy =
        round === 0
          ? original
          : { ...original, id: `${original.id}-${round}`, name: `${original.name} ${round + 1}` };
      parts.push(copy);
    }
    return { ...surface, parts };
  });
  return { ...plan, name: `Whimbrel of ${count} parts`, surfaces };
}
