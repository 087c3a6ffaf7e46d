import type { Plan, Surface } from '#shared/core/plan.ts';

/** A point in plan view, mm: x aft, y to starboard. */
export type PlanPoint = [x: number, y: number];

/** Outline of a surface's starboard half as seen from above, root to tip and back, tip block in. */
export function halfOutline(surface: Surface): PlanPoint[] {
  let [x, y] = surface.apex;
  const front: PlanPoint[] = [];
  const back: PlanPoint[] = [];
  for (const panel of surface.panels) {
    front.push([x, y]);
    back.push([x + panel.rootChord, y]);
    x += panel.sweep;
    y += panel.span * Math.cos((panel.dihedral * Math.PI) / 180);
    front.push([x, y]);
    back.push([x + panel.tipChord, y]);
  }
  return [...front, ...tipOutline(surface, x, y), ...back.reverse()];
}

const TIP_STEPS = 8;

/** Half an ellipse over the last section, where there is a tip block. */
function tipOutline({ panels, parts }: Surface, x: number, y: number): PlanPoint[] {
  const chord = panels.at(-1)?.tipChord ?? 0;
  const length = Math.max(0, ...parts.map((part) => (part.kind === 'tipBlock' ? part.length : 0)));
  if (length === 0 || chord === 0) return [];
  return Array.from({ length: TIP_STEPS - 1 }, (_, i): PlanPoint => {
    const angle = ((i + 1) / TIP_STEPS) * Math.PI;
    return [x + (chord / 2) * (1 - Math.cos(angle)), y + length * Math.sin(angle)];
  });
}

/** The surfaces that are seen from above, with what of the fuselage runs along the axis. */
export function seenFromAbove(plan: Plan): {
  surfaces: { key: string; half: PlanPoint[]; mirrored: boolean }[];
  bars: [PlanPoint, PlanPoint][];
} {
  return {
    surfaces: plan.surfaces
      .filter(({ panels }) => panels.some(({ dihedral }) => Math.abs(dihedral) < 60))
      .map((surface) => ({ key: surface.key, half: halfOutline(surface), mirrored: surface.mirrored })),
    bars: plan.solids.map((solid): [PlanPoint, PlanPoint] => {
      if (solid.shape === 'bar')
        return [
          [solid.from[0], solid.from[1]],
          [solid.to[0], solid.to[1]],
        ];
      const xs = solid.outline.map(([x]) => x);
      return [
        [Math.min(...xs), solid.y],
        [Math.max(...xs), solid.y],
      ];
    }),
  };
}
