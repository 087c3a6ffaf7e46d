/** True of an object or an array: of what has keys to look into. @example isBranch([]) // → true */
export const isBranch = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

/**
 * Whether two JSON values say the same: the order of keys does not matter, and a key that is undefined counts as
 * absent.
 * @example isAlike({ mass: 4, u: undefined }, { mass: 4 }) // → true
 * @example isAlike([1, 2], [2, 1]) // → false
 */
export function isAlike(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true;
  if (!isBranch(one) || !isBranch(other)) return one === 0 && other === 0;
  if (Array.isArray(one) !== Array.isArray(other)) return false;
  if (Array.isArray(one) && one.length !== other['length']) return false;
  const keys = new Set([...Object.keys(one), ...Object.keys(other)]);
  return [...keys].every((key) => isAlike(one[key], other[key]));
}
