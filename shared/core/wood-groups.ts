import type { Part, Plan, PlanMaterial, Solid } from './plan.ts';

/** Parts and solids that a wood trial gives one wood: those of one name of group, or else of one kind. */
export interface WoodGroup {
  key: string;
  /** in the order of the plan, each under the id of its line of the estimate */
  members: WoodPart[];
  /** keys of the materials that it is drawn in, in the order of the members */
  materials: string[];
}

/** A part or solid of wood, by the id of its line of the estimate: `wing/ribs`, `solid/boom`. */
export interface WoodPart {
  id: string;
  name: string;
  material: string;
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

const lineOf = (surface: string, part: Part) => `${surface}/${part.id}`;
const solidLineOf = ({ id }: Solid) => `solid/${id}`;
const solidGroup = ({ group }: Solid) => group.trim().toLowerCase();

/**
 * Groups of wooden parts of all surfaces, then of wooden solids, in the order of the plan.
 * @example woodGroups(EXAMPLE_PLAN).map(({ key }) => key) // → ['ribs', 'spars', 'sheeting', 'fuselage']
 */
export function woodGroups(plan: Plan): WoodGroup[] {
  const groups = new Map<string, WoodGroup>();
  const add = (key: string, { id, name, material }: WoodPart) => {
    if (plan.materials[material]?.category !== 'wood') return;
    const group = groups.get(key) ?? { key, members: [], materials: [] };
    group.members.push({ id, name, material });
    if (!group.materials.includes(material)) group.materials.push(material);
    groups.set(key, group);
  };
  for (const { key, parts } of plan.surfaces) {
    for (const part of parts) add(woodGroupKey(part), { ...part, id: lineOf(key, part) });
  }
  for (const solid of plan.solids) add(solidGroup(solid), { ...solid, id: solidLineOf(solid) });
  return [...groups.values()];
}

/**
 * Which wood each line gets: what is named for the part itself, or else for its group. Lines that keep their wood
 * are left out, and those that are not of wood keep it whatever their group.
 * @example Object.keys(woodsByLine(EXAMPLE_PLAN, { spars: { key: 'balsa', material: EXAMPLE_PLAN.materials['balsa'] } })) // → ['wing/spar']
 */
export function woodsByLine(
  plan: Plan,
  woods: Readonly<Record<string, TrialWood>>,
): Record<string, TrialWood> {
  return Object.fromEntries(
    woodGroups(plan).flatMap(({ key, members }) =>
      members.flatMap(({ id }): [string, TrialWood][] => {
        const wood = woods[id] ?? woods[key];
        return wood ? [[id, wood]] : [];
      }),
    ),
  );
}

/**
 * The plan with other woods for some groups (`woodGroups`) and single parts, by their keys; the part counts before
 * its group, and the plan given stays as it is. A wood whose key stands for another material in the plan goes in
 * under a free key; materials that nothing uses any more stay. What is not of wood keeps its material.
 * @example withWood(EXAMPLE_PLAN, { spars: { key: 'hard', material: { name: 'Hard', category: 'wood', density: 180, cv: 0.1 } } }).surfaces[0].parts[1].material // → 'hard'
 */
export function withWood(plan: Plan, woods: Readonly<Record<string, TrialWood>>): Plan {
  const materials = { ...plan.materials };
  const keyOf = new Map<string, string>();
  for (const [line, { key, material }] of Object.entries(woodsByLine(plan, woods))) {
    let free = key;
    for (let n = 2; materials[free] && !sameFigures(materials[free], material); n++) free = `${key}-${n}`;
    materials[free] ??= material;
    keyOf.set(line, free);
  }
  const surfaces = plan.surfaces.map((surface) => ({
    ...surface,
    parts: surface.parts.map((part) => {
      const key = keyOf.get(lineOf(surface.key, part));
      return key === undefined ? part : { ...part, material: key };
    }),
  }));
  const solids = plan.solids.map((solid) => {
    const key = keyOf.get(solidLineOf(solid));
    return key === undefined ? solid : { ...solid, material: key };
  });
  return { ...plan, materials, surfaces, solids };
}

function sameFigures(a: PlanMaterial | undefined, b: PlanMaterial): boolean {
  if (a?.category !== b.category || a.density !== b.density || a.areal !== b.areal || a.cv !== b.cv)
    return false;
  return a.modulus === b.modulus && a.strength === b.strength;
}
