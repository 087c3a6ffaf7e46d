import type { Item, Panel, Part, Plan, PlanMaterial, Solid, Surface } from '#shared/core/plan.ts';

/** Changes of a plan, each answering a new one and sharing with the old what did not change. */
export type Recipe = (plan: Plan) => Plan;

export function changeSurface(index: number, change: (surface: Surface) => Surface): Recipe {
  return (plan) => ({ ...plan, surfaces: plan.surfaces.map((s, i) => (i === index ? change(s) : s)) });
}

export function changeParts(index: number, change: (parts: Part[]) => Part[]): Recipe {
  return changeSurface(index, (surface) => ({ ...surface, parts: change(surface.parts) }));
}

export function changeItems(change: (items: Item[]) => Item[]): Recipe {
  return (plan) => ({ ...plan, items: change(plan.items) });
}

export function changeSolids(change: (solids: Solid[]) => Solid[]): Recipe {
  return (plan) => ({ ...plan, solids: change(plan.solids) });
}

/** One recipe after another, as one step. */
export function inTurn(...recipes: readonly Recipe[]): Recipe {
  return (plan) => recipes.reduce((p, recipe) => recipe(p), plan);
}

/** Copies a material's figures into the plan; what the plan already holds under that key stays as it is. */
export function keepMaterial(key: string, material: PlanMaterial): Recipe {
  return (plan) =>
    Object.hasOwn(plan.materials, key)
      ? plan
      : { ...plan, materials: { ...plan.materials, [key]: material } };
}

/** Drops a material that nothing uses any more; one that no table holds is kept, for it could not be got back. */
export function dropUnused(key: string, inTable: (key: string) => boolean): Recipe {
  return (plan) => {
    const users = [...plan.surfaces.flatMap((surface) => surface.parts), ...plan.solids];
    if (!inTable(key) || users.some((user) => user.material === key)) return plan;
    const { [key]: _, ...materials } = plan.materials;
    return { ...plan, materials };
  };
}

export type PanelNumber = 'span' | 'rootChord' | 'tipChord' | 'sweep' | 'dihedral';

/**
 * The panels with one field of one of them changed. Where two panels meet in one chord or one section, the
 * neighbour's follows, so that no step opens by accident; where they already differ each keeps its own.
 */
export function changePanel(panels: readonly Panel[], index: number, changes: Partial<Panel>): Panel[] {
  const old = panels[index];
  if (!old) return [...panels];
  return panels.map((panel, i) => {
    if (i === index) return { ...panel, ...changes };
    if (i === index + 1) {
      return {
        ...panel,
        ...(changes.tipChord !== undefined &&
          panel.rootChord === old.tipChord && { rootChord: changes.tipChord }),
        ...(changes.tipSection &&
          alike(panel.rootSection, old.tipSection) && { rootSection: changes.tipSection }),
      };
    }
    if (i === index - 1) {
      return {
        ...panel,
        ...(changes.rootChord !== undefined &&
          panel.tipChord === old.rootChord && { tipChord: changes.rootChord }),
        ...(changes.rootSection &&
          alike(panel.tipSection, old.rootSection) && { tipSection: changes.rootSection }),
      };
    }
    return panel;
  });
}

const alike = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/** A further panel that goes on from the last one, somewhat shorter and narrower. */
export function nextPanel(last: Panel): Panel {
  const round = (value: number) => Math.max(1, Math.round(value));
  return {
    ...last,
    span: round(last.span / 2),
    rootChord: last.tipChord,
    tipChord: round(last.tipChord * 0.75),
    sweep: round(last.tipChord * 0.1),
    rootSection: last.tipSection,
  };
}
