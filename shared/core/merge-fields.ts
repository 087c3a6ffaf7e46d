import { isAlike } from './alike.ts';
import { fieldChanges, type PlanChange } from './field-changes.ts';

/** Where two sides changed the same thing differently, so that somebody has to choose. */
export interface PlanConflict {
  /** unlike every other conflict of the same merge */
  id: string;
  /** place in the plan by keys, as in `PlanChange` */
  path: string;
  name: string;
  /** as in `PlanChange`; null where the whole thing was added twice, or removed by one and changed by the other */
  field: string | null;
  /** what each side made of what both began with */
  mine: PlanChange[];
  theirs: PlanChange[];
  /** both may stand side by side */
  canKeepBoth: boolean;
}

/** `before`: as it was before either side changed it. */
export type MergeChoice = 'mine' | 'theirs' | 'both' | 'before';
/** Decides a conflict. It is asked once for each, in the order of the document. */
export type Settle = (conflict: PlanConflict) => MergeChoice;

/** Place of a thing in the plan by keys, and its name, as a change tells them. */
export interface Where {
  path: string;
  name: string;
}

/** One value on three sheets: before, here, and there. */
export interface Three<T> {
  base: T;
  mine: T;
  theirs: T;
}

/**
 * The value that only one side changed, or that both changed alike; null where they disagree.
 * @example agreed({ base: 1, mine: 1, theirs: 2 }) // → { value: 2 }
 * @example agreed({ base: 1, mine: 3, theirs: 2 }) // → null
 */
export function agreed<T>({ base, mine, theirs }: Three<T>): { value: T } | null {
  if (isAlike(theirs, base) || isAlike(mine, theirs)) return { value: mine };
  return isAlike(mine, base) ? { value: theirs } : null;
}

/**
 * The value that a choice stands for. `both` is mine here: who can keep both has done so before.
 * @example chosen({ base: 1, mine: 2, theirs: 3 }, 'theirs') // → 3
 */
export const chosen = <T>({ base, mine, theirs }: Three<T>, choice: MergeChoice): T =>
  choice === 'theirs' ? theirs : choice === 'before' ? base : mine;

/**
 * Id of a conflict about a field of the thing at `path`, or about the whole of it (`field` null).
 * @example conflictId('items/nose', 'mass') // → 'items/nose#mass'
 */
export const conflictId = (path: string, field: string | null) => `${path}#${field ?? ''}`;

/**
 * Fields that say something together: where one of them comes or goes on either side, they are one value, so that
 * ribs are never in equal steps and at stations of their own at once.
 */
const TOGETHER = ['stations from to count', 'seat at letIn', 'profile wall', 'method share layers'].map(
  (fields) => fields.split(' '),
);

/**
 * One and the same thing of both sides, joined field by field; without a base, both sides have added it. `settle`
 * is asked for each field, or bundle of fields that say something together, that both changed and not alike.
 * @example mergeFields({ path: 'items/nose', name: 'Nose' }, { base: { mass: 1, u: 0 }, mine: { mass: 2, u: 0 }, theirs: { mass: 1, u: 1 } }, () => 'mine') // → { mass: 2, u: 1 }
 */
export function mergeFields<T extends object>(
  where: Where,
  { base, mine, theirs }: { base: T | undefined; mine: T; theirs: T },
  settle: Settle,
): T {
  const sides = [base ?? {}, mine, theirs].map(presentFields);
  const merged: Record<string, unknown> = {};
  for (const fields of bundlesOf(sides)) {
    const [was = {}, here = {}, there = {}] = sides.map((side) => onlyFields(side, fields));
    const three = { base: was, mine: here, theirs: there };
    const value = agreed(three)?.value ?? chosen(three, settle(fieldConflict(where, fields, three)));
    Object.assign(merged, value);
  }
  return merged as T;
}

type Fields = ReadonlyMap<string, unknown>;

const presentFields = (thing: object): Fields =>
  new Map(Object.entries(thing).filter(([, value]) => value !== undefined));

const onlyFields = (side: Fields, fields: readonly string[]): Record<string, unknown> =>
  Object.fromEntries(fields.filter((field) => side.has(field)).map((field) => [field, side.get(field)]));

function bundlesOf(sides: readonly Fields[]): string[][] {
  const names = new Set(sides.flatMap((side) => [...side.keys()]));
  const bundles = TOGETHER.filter((fields) =>
    fields.some((field) => sides.some((side) => side.has(field)) && !sides.every((side) => side.has(field))),
  ).map((fields) => fields.filter((field) => names.has(field)));
  const bundled = new Set(bundles.flat());
  return [...bundles, ...[...names].filter((name) => !bundled.has(name)).map((name) => [name])];
}

function fieldConflict(where: Where, fields: readonly string[], three: Three<object>): PlanConflict {
  const mine = fieldChanges(where, three.base, three.mine);
  const field = mine[0]?.field ?? fields[0] ?? null;
  return {
    ...where,
    id: conflictId(where.path, field),
    field,
    mine,
    theirs: fieldChanges(where, three.base, three.theirs),
    canKeepBoth: false,
  };
}
