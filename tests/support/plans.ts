import { readFileSync } from 'node:fs';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate, Line } from '#shared/core/result.ts';
import { planSchema } from '#shared/schemas/plan.ts';

/** A demo glider's plan, read and validated like any other. */
export function demoPlan(name: 'dunlin' | 'plover' | 'whimbrel'): Plan {
  const file = new URL(`../../data/demo/gliders/${name}.json`, import.meta.url);
  return planSchema.parse(JSON.parse(readFileSync(file, 'utf8')));
}

export const DEMO_NAMES = ['dunlin', 'plover', 'whimbrel'] as const;

/** Round figures, so that sums can be checked by hand. */
export const MATERIALS: Plan['materials'] = {
  balsa: { name: 'Balsa', category: 'wood', density: 100, cv: 0.1 },
  hard: { name: 'Balsa, hard', category: 'wood', density: 200, cv: 0.05 },
  ply: { name: 'Thin ply', category: 'wood', areal: 500, cv: 0.05 },
  tissue: { name: 'Tissue', category: 'covering', areal: 20, cv: 0.1 },
  glue: { name: 'Glue', category: 'adhesive', spread: 80, density: 1100, cv: 0.3 },
};

/** A rectangular wing of 200 mm chord and 500 mm half span with the given parts. */
export function wingOf(parts: Part[], changes: Partial<Surface> = {}): Surface {
  return {
    key: 'wing',
    role: 'wing',
    apex: [0, 0, 0],
    mirrored: true,
    panels: [
      {
        span: 500,
        rootChord: 200,
        tipChord: 200,
        sweep: 0,
        dihedral: 0,
        rootSection: { naca: '0012' },
        tipSection: { naca: '0012' },
      },
    ],
    parts,
    ...changes,
  };
}

export function planOf(surfaces: Surface[], changes: Partial<Plan> = {}): Plan {
  return { version: 1, name: 'Test', materials: MATERIALS, surfaces, items: [], solids: [], ...changes };
}

/** The line of an id; a test that asks for one that is not there fails here, by name. */
export function lineOf(result: Estimate, id: string): Line {
  const line = result.lines.find((l) => l.id === id);
  if (!line) throw new Error(`no line ${id}`);
  return line;
}
