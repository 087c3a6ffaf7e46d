import { same } from './same.ts';

/** How one JSON value becomes another, as JSON: small where little differs. */
export type Delta =
  /** another value altogether */
  | { is: unknown }
  /** fields of an object; null for one that goes */
  | { of: Record<string, Delta | null> }
  /** entries of a list that stays as long */
  | { at: [index: number, delta: Delta][] }
  /** a run of a list replaced by another */
  | { cut: [start: number, count: number, put: unknown[]] };

type Branch = Record<string, unknown>;

/** Null where the two say the same. */
export function deltaOf(from: unknown, to: unknown): Delta | null {
  if (Object.is(from, to)) return null;
  if (Array.isArray(from) && Array.isArray(to)) return listDelta(from, to);
  if (isObject(from) && isObject(to)) return objectDelta(from, to);
  return same(from, to) ? null : { is: to };
}

/** The value that a delta leads to; what it does not name is shared with the value that it starts from. */
export function applied(from: unknown, delta: Delta | null): unknown {
  if (delta === null) return from;
  if ('is' in delta) return delta.is;
  if ('of' in delta) {
    const fields = new Map(isObject(from) ? Object.entries(from) : []);
    for (const [key, change] of Object.entries(delta.of)) {
      if (change === null) fields.delete(key);
      else fields.set(key, applied(fields.get(key), change));
    }
    return Object.fromEntries(fields);
  }
  const list: readonly unknown[] = Array.isArray(from) ? from : [];
  if ('cut' in delta) {
    const [start, count, put] = delta.cut;
    return [...list.slice(0, start), ...put, ...list.slice(start + count)];
  }
  const result = [...list];
  for (const [index, change] of delta.at) result[index] = applied(result[index], change);
  return result;
}

function objectDelta(from: Branch, to: Branch): Delta | null {
  const changes = [...new Set([...Object.keys(from), ...Object.keys(to)])].flatMap(
    (key): [string, Delta | null][] => {
      const [was, is] = [own(from, key), own(to, key)];
      if (is === undefined) return was === undefined ? [] : [[key, null]];
      const delta = was === undefined ? { is } : deltaOf(was, is);
      return delta === null ? [] : [[key, delta]];
    },
  );
  return changes.length === 0 ? null : { of: Object.fromEntries(changes) };
}

function listDelta(from: readonly unknown[], to: readonly unknown[]): Delta | null {
  if (from.length === to.length) {
    const at = from.flatMap((entry, i): [number, Delta][] => {
      const delta = deltaOf(entry, to[i]);
      return delta === null ? [] : [[i, delta]];
    });
    return at.length === 0 ? null : { at };
  }
  const shorter = Math.min(from.length, to.length);
  let start = 0;
  while (start < shorter && same(from[start], to[start])) start += 1;
  let end = 0;
  while (end < shorter - start && same(from.at(-1 - end), to.at(-1 - end))) end += 1;
  return { cut: [start, from.length - start - end, to.slice(start, to.length - end)] };
}

const isObject = (value: unknown): value is Branch =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const own = (branch: Branch, key: string): unknown => (Object.hasOwn(branch, key) ? branch[key] : undefined);
