import type { Part, Plan, PlanMaterial } from './plan.ts';

/** Parts of the surfaces that a wood trial gives one wood: the parts of one name of group, or else of one kind. */
export interface WoodGroup {
  key: string;
  parts: Part[];
  /** keys of the materials that it is drawn in, in the order of the parts */
  materials: string[];
}

/** A wood as a trial takes it: key in the plan's materials, and its figures. */
export interface TrialWood {
  key: string;
  material: PlanMaterial;
}

/** Strips wider than this somewhere, mm, are spars. */
const SPAR_WIDTH = 3;

/**
 * Name of the group that a part is cut with: its own group, or else one by its kind.
 * @example woodGroupKey({ kind: 'sheet', id: 'fin', name: 'Fin', group: 'Tail ', material: 'balsa', thickness: 3, cutout: 0 }) // → 'tail'
 */
export function woodGroupKey(part: Part): string {
  const own = part.group?.trim().toLowerCase();
  if (own) return own;
  switch (part.kind) {
    case 'strip':
      if (part.seat === 'nose' || part.seat === 'tail') return 'edges';
      return Math.max(...part.width) > SPAR_WIDTH ? 'spars' : 'stringers';
    case 'skin':
      return 'sheeting';
    case 'capStrips':
      return 'cap strips';
    case 'web':
      return 'webs';
    case 'tipBlock':
      return 'tips';
    default:
      return part.kind;
  }
}

/**
 * Groups of wooden parts of all surfaces, in the order of the plan.
 * @example woodGroups(EXAMPLE_PLAN).map(({ key }) => key) // → ['ribs', 'spars', 'sheeting']
 */
export function woodGroups(plan: Plan): WoodGroup[] {
  const groups = new Map<string, WoodGroup>();
  for (const part of plan.surfaces.flatMap(({ parts }) => parts)) {
    if (plan.materials[part.material]?.category !== 'wood') continue;
    const key = woodGroupKey(part);
    const group = groups.get(key) ?? { key, parts: [], materials: [] };
    group.parts.push(part);
    if (!group.materials.includes(part.material)) group.materials.push(part.material);
    groups.set(key, group);
  }
  return [...groups.values()];
}

/**
 * The plan with other woods for some groups, by their keys; the plan given stays as it is. A wood whose key stands
 * for another material in the plan goes in under a free key; materials that nothing uses any more stay. Parts that
 * are not of wood keep their material, whatever their group.
 * @example withWood(EXAMPLE_PLAN, { spars: { key: 'hard', material: { name: 'Hard', category: 'wood', density: 180, cv: 0.1 } } }).surfaces[0].parts[1].material // → 'hard'
 */
export function withWood(plan: Plan, woods: Readonly<Record<string, TrialWood>>): Plan {
  const materials = { ...plan.materials };
  const keyOf = new Map<string, string>();
  for (const [group, { key, material }] of Object.entries(woods)) {
    let free = key;
    for (let n = 2; materials[free] && !sameFigures(materials[free], material); n++) free = `${key}-${n}`;
    materials[free] ??= material;
    keyOf.set(group, free);
  }
  const surfaces = plan.surfaces.map((surface) => ({
    ...surface,
    parts: surface.parts.map((part) => {
      const key =
        plan.materials[part.material]?.category === 'wood' ? keyOf.get(woodGroupKey(part)) : undefined;
      return key === undefined ? part : { ...part, material: key };
    }),
  }));
  return { ...plan, materials, surfaces };
}

function sameFigures(a: PlanMaterial | undefined, b: PlanMaterial): boolean {
  return a?.category === b.category && a.density === b.density && a.areal === b.areal && a.cv === b.cv;
}
