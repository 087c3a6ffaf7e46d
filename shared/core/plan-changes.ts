import { fieldChanges, type PlanChange } from './field-changes.ts';
import type { Panel, Plan, PlanMaterial, Solid, Surface } from './plan.ts';

/** A thing of the plan under its key. */
interface Thing {
  name: string;
  /** its kind in one word; another kind under the same key is another thing */
  kind: string;
  fields: object;
}

/**
 * What differs between two plans, in the order of the document: materials, surfaces with panels and parts, items,
 * solids, aims. Things are told apart by their keys, so that a part moved in its list is still that part. Empty for
 * plans that are alike, and for these only.
 * @example planChanges(EXAMPLE_PLAN, { ...EXAMPLE_PLAN, name: 'Board' }) // → [{ path: '', name: 'Board', field: 'name', from: 'Plank', to: 'Board', unit: null }]
 */
export function planChanges(before: Plan, after: Plan): PlanChange[] {
  return [
    ...fieldChanges({ path: '', name: after.name }, { name: before.name }, { name: after.name }),
    ...thingChanges('materials', materialsOf(before), materialsOf(after)),
    ...listChanges('surfaces', before.surfaces, after.surfaces, (s) => [s.key, surfaceThing(s)]),
    ...pairsOf(before.surfaces, after.surfaces).flatMap(insideSurface),
    ...listChanges('items', before.items, after.items, (item) => [
      item.id,
      { name: item.name, kind: 'item', fields: item },
    ]),
    ...listChanges('solids', before.solids, after.solids, (solid) => [solid.id, solidThing(solid)]),
    ...fieldChanges({ path: 'target', name: 'Target' }, before.target ?? {}, after.target ?? {}),
    ...fieldChanges({ path: 'flight', name: 'Flight' }, before.flight ?? {}, after.flight ?? {}),
  ];
}

const materialsOf = (plan: Plan): Map<string, Thing> =>
  new Map(
    Object.entries(plan.materials).map(([key, material]: [string, PlanMaterial]) => [
      key,
      { name: material.name, kind: material.category, fields: material },
    ]),
  );

const surfaceThing = ({ key, role, apex, mirrored }: Surface): Thing => ({
  name: key,
  kind: role,
  fields: { apex, mirrored },
});

const solidThing = (solid: Solid): Thing => ({ name: solid.name, kind: solid.shape, fields: solid });

/** Surfaces that are in both plans and still the same kind of surface. */
const pairsOf = (before: readonly Surface[], after: readonly Surface[]): [Surface, Surface][] =>
  after.flatMap((surface): [Surface, Surface][] => {
    const earlier = before.find(({ key, role }) => key === surface.key && role === surface.role);
    return earlier ? [[earlier, surface]] : [];
  });

function insideSurface([before, after]: [Surface, Surface]): PlanChange[] {
  const path = `surfaces/${after.key}`;
  const panels = ({ key, panels: list }: Surface) =>
    new Map(
      list.map((panel: Panel, i) => [
        String(i + 1),
        { name: `${key}, panel ${i + 1}`, kind: 'panel', fields: panel },
      ]),
    );
  return [
    ...thingChanges(`${path}/panels`, panels(before), panels(after)),
    ...listChanges(`${path}/parts`, before.parts, after.parts, (part) => [
      part.id,
      { name: part.name, kind: part.kind, fields: part },
    ]),
  ];
}

function listChanges<T>(
  path: string,
  before: readonly T[],
  after: readonly T[],
  entry: (thing: T) => [string, Thing],
): PlanChange[] {
  const [earlier, later] = [new Map(before.map(entry)), new Map(after.map(entry))];
  const kept = (keys: Iterable<string>) => [...keys].filter((key) => earlier.has(key) && later.has(key));
  const [was, is] = [kept(earlier.keys()), kept(later.keys())];
  const moved = was.some((key, i) => key !== is[i]);
  const order: PlanChange = { path, name: '', field: 'order', from: null, to: null, unit: null };
  return [...thingChanges(path, earlier, later), ...(moved ? [order] : [])];
}

function thingChanges(
  path: string,
  before: ReadonlyMap<string, Thing>,
  after: ReadonlyMap<string, Thing>,
): PlanChange[] {
  const changes: PlanChange[] = [];
  const whole = { field: null, unit: null };
  for (const key of new Set([...before.keys(), ...after.keys()])) {
    const [was, is] = [before.get(key), after.get(key)];
    const place = `${path}/${key}`;
    if (was && is && was.kind === is.kind) {
      changes.push(...fieldChanges({ path: place, name: is.name }, was.fields, is.fields));
      continue;
    }
    if (was) changes.push({ path: place, name: was.name, ...whole, from: was.kind, to: null });
    if (is) changes.push({ path: place, name: is.name, ...whole, from: null, to: is.kind });
  }
  return changes;
}
