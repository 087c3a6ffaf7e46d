import type {
  Item,
  Panel,
  Part,
  Plan,
  PlanMaterial,
  SectionSpec,
  Solid,
  Surface,
} from '#shared/core/plan.ts';

/** A plan of nothing; the fields that a check is about are put in. */
export function plainPlan(fields: Partial<Omit<Plan, 'version'>>): Plan {
  return { version: 1, name: 'Check', materials: {}, surfaces: [], items: [], solids: [], ...fields };
}

/** A plan of bare masses at arms. */
export function itemsPlan(rows: readonly { mass: number; at: number }[]): Plan {
  const items = rows.map(({ mass, at }, i): Item => ({
    id: `row-${i}`,
    name: `Row ${i + 1}`,
    group: 'load',
    mass,
    at: [at, 0, 0],
  }));
  return plainPlan({ items });
}

/** Density 1 kg/dm³: a line's grams are its volume in mm³ over a thousand. */
export const UNIT_WOOD: PlanMaterial = { name: 'Unit wood', category: 'wood', density: 1000, cv: 0.1 };

export function solidPlan(solid: Solid): Plan {
  return plainPlan({ materials: { unit: UNIT_WOOD }, solids: [solid] });
}

export function panel(fields: Partial<Panel> & Pick<Panel, 'span' | 'rootChord' | 'tipChord'>): Panel {
  const section: SectionSpec = { naca: '0012' };
  return { sweep: 0, dihedral: 0, rootSection: section, tipSection: section, ...fields };
}

export function surface(panels: Panel[], parts: Part[] = [], fields: Partial<Surface> = {}): Surface {
  return { key: 'wing', role: 'wing', apex: [0, 0, 0], mirrored: true, panels, parts, ...fields };
}
