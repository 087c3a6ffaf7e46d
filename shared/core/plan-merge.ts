import { fieldChanges } from './field-changes.ts';
import {
  agreed,
  chosen,
  conflictId,
  mergeFields,
  type MergeChoice,
  type PlanConflict,
  type Settle,
  type Three,
} from './merge-fields.ts';
import { mergeList, type ListKind } from './merge-lists.ts';
import { mergePanels } from './merge-panels.ts';
import type { Item, Part, Plan, PlanMaterial, Solid, Surface } from './plan.ts';

/** Two plans in one, and what had to be chosen. */
export interface PlanMerge {
  plan: Plan;
  /** in the order of the document; empty where the two sides changed different things, or the same alike */
  conflicts: PlanConflict[];
}

/**
 * Joins two plans that were both made from `base`, thing by thing and field by field: what only one side changed is
 * taken over, what both changed alike is taken once. Where both changed the same field differently, one removed
 * what the other changed, both added a thing under one key, or both put a list in another order, there is a
 * conflict, which `settle` decides; mine stands unless it does. Materials that a part still names are kept. The
 * joined plan may break a rule that each side keeps (a port part on a wing that is no longer mirrored): check it
 * like any other.
 * @example mergePlans(EXAMPLE_PLAN, { ...EXAMPLE_PLAN, name: 'Board' }, { ...EXAMPLE_PLAN, items: [] }).plan.name // → 'Board'
 * @example mergePlans(EXAMPLE_PLAN, { ...EXAMPLE_PLAN, name: 'Board' }, { ...EXAMPLE_PLAN, name: 'Raft' }).conflicts.length // → 1
 */
export function mergePlans(base: Plan, mine: Plan, theirs: Plan, settle: Settle = () => 'mine'): PlanMerge {
  const conflicts: PlanConflict[] = [];
  const told = (conflict: PlanConflict): MergeChoice => {
    conflicts.push(conflict);
    return settle(conflict);
  };
  const three = { base, mine, theirs };
  const whole = agreed(three);
  if (whole) return { plan: whole.value, conflicts };
  const { name } = mergeFields({ path: '', name: mine.name }, each(three, nameOnly), told);
  const materials = mergeMaterials(
    each(three, (plan) => plan.materials),
    told,
  );
  const surfaces = mergeList(
    each(three, (plan) => plan.surfaces),
    surfaceKind(told),
    told,
  );
  const items = mergeList(
    each(three, (plan) => plan.items),
    itemKind(told),
    told,
  );
  const solids = mergeList(
    each(three, (plan) => plan.solids),
    solidKind(told),
    told,
  );
  const target = mergeOptional(
    'target',
    'Target',
    each(three, (plan) => plan.target),
    told,
  );
  const flight = mergeOptional(
    'flight',
    'Flight',
    each(three, (plan) => plan.flight),
    told,
  );
  const plan: Plan = {
    version: 1,
    name,
    materials,
    surfaces,
    items,
    solids,
    ...(target && { target }),
    ...(flight && { flight }),
  };
  return { plan: withMaterials(plan, [mine, theirs, base]), conflicts };
}

const nameOnly = ({ name }: Plan) => ({ name });

function each<T, R>({ base, mine, theirs }: Three<T>, map: (side: T) => R): Three<R> {
  return { base: map(base), mine: map(mine), theirs: map(theirs) };
}

interface Keyed<T> {
  key: string;
  thing: T;
}

function mergeMaterials(three: Three<Plan['materials']>, settle: Settle): Plan['materials'] {
  const listed = each(three, (materials) =>
    Object.entries(materials).map(([key, thing]): Keyed<PlanMaterial> => ({ key, thing })),
  );
  const merged = mergeList(
    listed,
    {
      path: 'materials',
      keyOf: ({ key }) => key,
      nameOf: ({ thing }) => thing.name,
      kindOf: ({ thing }) => thing.category,
      merge: (where, { base, mine, theirs }) => ({
        key: mine.key,
        thing: mergeFields(where, { base: base?.thing, mine: mine.thing, theirs: theirs.thing }, settle),
      }),
      joinAdded: true,
    },
    settle,
  );
  return Object.fromEntries(merged.map(({ key, thing }) => [key, thing]));
}

const surfaceKind = (settle: Settle): ListKind<Surface> => ({
  path: 'surfaces',
  keyOf: ({ key }) => key,
  nameOf: ({ key }) => key,
  kindOf: ({ role }) => role,
  merge: (where, { base, mine, theirs }) => {
    const three = { base: base ?? mine, mine, theirs };
    const frame = ({ key, role, apex, mirrored }: Surface) => ({ key, role, apex, mirrored });
    return {
      ...mergeFields(where, each(three, frame), settle),
      panels: mergePanels(
        mine.key,
        each(three, ({ panels }) => panels),
        settle,
      ),
      parts: mergeList(
        each(three, ({ parts }) => parts),
        partKind(where.path, settle),
        settle,
      ),
    };
  },
});

const partKind = (surface: string, settle: Settle): ListKind<Part> => ({
  ...rowKind<Part>(`${surface}/parts`, settle),
  kindOf: ({ kind }) => kind,
});
const itemKind = (settle: Settle): ListKind<Item> => ({
  ...rowKind<Item>('items', settle),
  kindOf: () => 'item',
});
const solidKind = (settle: Settle): ListKind<Solid> => ({
  ...rowKind<Solid>('solids', settle),
  kindOf: ({ shape }) => shape,
});

const rowKind = <T extends { id: string; name: string }>(
  path: string,
  settle: Settle,
): Omit<ListKind<T>, 'kindOf'> => ({
  path,
  keyOf: ({ id }) => id,
  nameOf: ({ name }) => name,
  merge: (where, three) => mergeFields(where, three, settle),
  rekey: (thing, id) => ({ ...thing, id }),
});

/** The wanted balance or the flight figures, which a plan may be without. */
function mergeOptional<T extends object>(
  path: string,
  name: string,
  three: Three<T | undefined>,
  settle: Settle,
): T | undefined {
  const found = agreed(three);
  if (found) return found.value;
  const { base, mine, theirs } = three;
  const where = { path, name };
  if (mine && theirs) return mergeFields(where, { base, mine, theirs }, settle);
  const changes = (side: T | undefined) => fieldChanges(where, base ?? {}, side ?? {});
  return chosen(
    three,
    settle({
      ...where,
      id: conflictId(path, null),
      field: null,
      mine: changes(mine),
      theirs: changes(theirs),
      canKeepBoth: false,
    }),
  );
}

/** One side may have let a material go that the other has put to a new use. */
function withMaterials(plan: Plan, sides: readonly Plan[]): Plan {
  const named = [...plan.surfaces.flatMap(({ parts }) => parts), ...plan.solids].map(
    ({ material }) => material,
  );
  const missing = [...new Set(named)].filter((key) => !Object.hasOwn(plan.materials, key));
  const found = missing.flatMap((key): [string, PlanMaterial][] => {
    const material = sides.map(({ materials }) => materials[key]).find((one) => one !== undefined);
    return material ? [[key, material]] : [];
  });
  return found.length === 0
    ? plan
    : { ...plan, materials: { ...plan.materials, ...Object.fromEntries(found) } };
}
