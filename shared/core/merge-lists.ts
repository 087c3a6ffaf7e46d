import { fieldChanges, type PlanChange } from './field-changes.ts';
import { isAlike } from './alike.ts';
import {
  agreed,
  chosen,
  conflictId,
  type PlanConflict,
  type Settle,
  type Three,
  type Where,
} from './merge-fields.ts';
import { mergedOrder } from './merge-order.ts';

/** How the things of a list are told apart, told of and joined. */
export interface ListKind<T> {
  /** place of the list in the plan, such as `surfaces/wing/parts` */
  path: string;
  keyOf: (thing: T) => string;
  nameOf: (thing: T) => string;
  /** in one word; another kind under the same key is another thing */
  kindOf: (thing: T) => string;
  /** one and the same thing on all sides; without a base, both sides have added it */
  merge: (where: Where, three: { base: T | undefined; mine: T; theirs: T }) => T;
  /** the same under another key, where two that were added under one key can stand side by side */
  rekey?: (thing: T, key: string) => T;
  /** things that are added twice are joined field by field instead */
  joinAdded?: boolean;
}

/** Longest key that a number is hung on. */
const KEY_ROOM = 56;

/**
 * A list of things with keys: what one side added, changed, moved or removed, joined with the other's. `settle` is
 * asked for what both did to one thing and cannot be joined, and for the order where both changed it; where a side
 * has two things under one key, for the list as a whole.
 * @example mergeList({ base: ['a'], mine: ['a', 'b'], theirs: ['c', 'a'] }, { path: 'items', keyOf: String, nameOf: String, kindOf: () => 'item', merge: (_, { mine }) => mine }, () => 'mine') // → ['c', 'a', 'b']
 */
export function mergeList<T>(three: Three<readonly T[]>, kind: ListKind<T>, settle: Settle): T[] {
  const whole = agreed(three);
  if (whole) return [...whole.value];
  const keys = mapSides(three, (list) => list.map(kind.keyOf));
  // Two things under one key cannot be told apart, so that the list is one value.
  if (Object.values(keys).some((list) => new Set(list).size < list.length)) {
    const where = { path: kind.path, name: '' };
    return [...chosen(three, settle(wholeConflict(where, ['list'], ['list'])))];
  }
  const maps = mapSides(three, (list) => new Map(list.map((thing) => [kind.keyOf(thing), thing])));
  const taken = new Set(Object.values(keys).flat());
  const kept = new Map<string, T[]>();
  for (const key of taken) {
    const things = mergeThing(
      key,
      mapSides(maps, (map) => map.get(key)),
      kind,
      taken,
      settle,
    );
    if (things.length > 0) kept.set(key, things);
  }
  const order = mergedOrder(kind.path, keys, new Set(kept.keys()), settle);
  return order.flatMap((key) => kept.get(key) ?? []);
}

function mapSides<T, R>({ base, mine, theirs }: Three<T>, map: (side: T) => R): Three<R> {
  return { base: map(base), mine: map(mine), theirs: map(theirs) };
}

/** What stands under a key afterwards: nothing, one thing, or both. */
function mergeThing<T>(
  key: string,
  three: Three<T | undefined>,
  kind: ListKind<T>,
  taken: ReadonlySet<string>,
  settle: Settle,
): T[] {
  const listed = (thing: T | undefined) => (thing === undefined ? [] : [thing]);
  const found = agreed(three);
  if (found) return listed(found.value);
  const { base, mine, theirs } = three;
  const named = mine ?? theirs ?? base;
  const where = { path: `${kind.path}/${key}`, name: named === undefined ? key : kind.nameOf(named) };
  const oneKind = new Set([base, mine, theirs].flatMap(listed).map(kind.kindOf)).size === 1;
  const joins = base !== undefined || kind.joinAdded === true;
  if (mine !== undefined && theirs !== undefined && oneKind && joins) {
    return [kind.merge(where, { base, mine, theirs })];
  }
  const addedTwice = base === undefined && mine !== undefined && theirs !== undefined;
  const conflict: PlanConflict = {
    ...where,
    id: conflictId(where.path, null),
    field: null,
    mine: thingChanges(where, base, mine, addedTwice ? theirs : undefined, kind),
    theirs: thingChanges(where, base, theirs, addedTwice ? mine : undefined, kind),
    canKeepBoth: addedTwice && kind.rekey !== undefined,
  };
  const choice = settle(conflict);
  if (choice === 'both' && addedTwice && kind.rekey) {
    return [theirs, kind.rekey(mine, freshKey(key, taken))];
  }
  return listed(chosen(three, choice));
}

/** What one side did to a thing; for one that both added, also where it differs from the other's. */
function thingChanges<T>(
  where: Where,
  before: T | undefined,
  after: T | undefined,
  other: T | undefined,
  kind: ListKind<T>,
): PlanChange[] {
  const word = (thing: T | undefined) => (thing === undefined ? null : kind.kindOf(thing));
  const [was, is] = [word(before), word(after)];
  if (was !== null && was === is) return fieldChanges(where, fieldsOf(before), fieldsOf(after));
  const whole: PlanChange = { ...where, field: null, from: was, to: is, unit: null };
  if (other === undefined) return [whole];
  const [own, others] = [new Map(Object.entries(fieldsOf(after))), new Map(Object.entries(fieldsOf(other)))];
  const unlike = [...own].filter(([field, value]) => !isAlike(value, others.get(field)));
  return [whole, ...fieldChanges(where, {}, Object.fromEntries(unlike))];
}

/** Whatever is no list of things inside the thing. */
const fieldsOf = (thing: unknown): object =>
  Object.fromEntries(
    Object.entries(thing ?? {}).filter(([field]) => field !== 'parts' && field !== 'panels'),
  );

/**
 * A conflict about something that is one value for either side, which its changes tell in a word (`mine`,
 * `theirs`).
 * @example wholeConflict({ path: 'surfaces/wing', name: 'wing' }, ['2 panels'], ['3 panels'], 'panels').id // → 'surfaces/wing#panels'
 */
export function wholeConflict(where: Where, mine: string[], theirs: string[], field: string | null = null) {
  const changes = (words: string[]): PlanChange[] =>
    words.map((word) => ({ ...where, field, from: null, to: word, unit: null }));
  return {
    ...where,
    id: conflictId(where.path, field),
    field,
    mine: changes(mine),
    theirs: changes(theirs),
    canKeepBoth: false,
  };
}

function freshKey(key: string, taken: ReadonlySet<string>): string {
  const stem = key.slice(0, KEY_ROOM);
  let n = 2;
  while (taken.has(`${stem}-${n}`)) n += 1;
  return `${stem}-${n}`;
}
