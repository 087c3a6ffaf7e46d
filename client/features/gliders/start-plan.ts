import type { Plan } from '#shared/core/plan.ts';

/** A blank sheet that is already a plan: two plain wing halves, to be drawn on. */
export function startPlan(name: string): Plan {
  return {
    version: 1,
    name,
    materials: {},
    surfaces: [
      {
        key: 'wing',
        role: 'wing',
        apex: [0, 0, 0],
        mirrored: true,
        panels: [
          {
            span: 500,
            rootChord: 150,
            tipChord: 120,
            sweep: 12,
            dihedral: 5,
            rootSection: { naca: '4409' },
            tipSection: { naca: '4409' },
          },
        ],
        parts: [],
      },
    ],
    items: [],
    solids: [],
  };
}
