/**
 * Whether two JSON values say the same. The order of keys does not matter, for the database does not keep it, and
 * a key that is undefined counts as absent.
 */
export function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) || Array.isArray(b)) {
    return Array.isArray(a) && Array.isArray(b) && a.length === b.length && a.every((v, i) => same(v, b[i]));
  }
  const left = present(a);
  const right = present(b);
  return (
    left.size === right.size &&
    [...left].every(([key, value]) => right.has(key) && same(value, right.get(key)))
  );
}

function present(value: object): Map<string, unknown> {
  return new Map(Object.entries(value).filter(([, v]) => v !== undefined));
}
