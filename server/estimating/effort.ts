import type { Part, Plan } from '#shared/core/plan.ts';

const ribCount = (part: Part) => (part.kind === 'ribs' ? (part.stations?.length ?? part.count ?? 0) : 0);

/**
 * A rough count of what an estimate has to look at: every part of a surface against every other, every rib against
 * every part, and against every point of a section. About a microsecond each.
 */
export function effortOf(plan: Plan): number {
  return plan.surfaces.reduce((sum, { parts, panels }) => {
    const ribs = parts.reduce((count, part) => count + ribCount(part), 0);
    const points = Math.max(
      0,
      ...panels.flatMap(({ rootSection, tipSection }) =>
        [rootSection, tipSection].map((section) => ('points' in section ? section.points.length : 0)),
      ),
    );
    return sum + parts.length ** 2 + ribs * (parts.length + points);
  }, plan.items.length + plan.solids.length);
}
