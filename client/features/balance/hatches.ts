import { hatchFill } from '#client/components/ui/hatch.tsx';
import type { Plan } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';

/** Fill of one line by what it is made of; items are gear, ballast is metal. */
export function lineHatch(plan: Plan, line: Pick<Line, 'material' | 'group'>): string {
  const material = line.material === null ? undefined : plan.materials[line.material];
  if (material) return hatchFill(material.category, material.density);
  return hatchFill(line.group.trim().toLowerCase() === 'ballast' ? 'metal' : 'gear');
}

/** Fill of a group: that of what weighs most in it. */
export function groupHatch(plan: Plan, lines: readonly Pick<Line, 'material' | 'group' | 'mass'>[]): string {
  const weights = new Map<string, number>();
  for (const line of lines) {
    const fill = lineHatch(plan, line);
    weights.set(fill, (weights.get(fill) ?? 0) + line.mass);
  }
  const [heaviest] = [...weights].sort(([, a], [, b]) => b - a);
  return heaviest?.[0] ?? hatchFill('gear');
}
