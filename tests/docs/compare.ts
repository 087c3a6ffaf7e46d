const RELATIVE = 1e-9;

const isBranch = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

function isSame(got: unknown, wanted: unknown): boolean {
  if (typeof got !== 'number' || typeof wanted !== 'number') return Object.is(got, wanted);
  return got === wanted || Math.abs(got - wanted) <= RELATIVE * Math.max(Math.abs(got), Math.abs(wanted));
}

/**
 * Where two values differ, numbers by more than a relative 1e-9; empty if nowhere.
 * A key that holds undefined counts as absent.
 */
export function differences(got: unknown, wanted: unknown, at = ''): string[] {
  if (isBranch(got) && isBranch(wanted) && Array.isArray(got) === Array.isArray(wanted)) {
    const keys = new Set([...Object.keys(got), ...Object.keys(wanted)]);
    return [...keys].flatMap((key) => differences(got[key], wanted[key], `${at}.${key}`));
  }
  return isSame(got, wanted) ? [] : [`${at}: ${JSON.stringify(got)} instead of ${JSON.stringify(wanted)}`];
}
