import { expect } from 'vitest';

/** The same few sums, done twice in doubles: some dozen roundings of 1.1e-16 each. */
export const SAME_SUM = 1e-13;
/** Integration of smooth curves by the core, judged against values known to nine digits. */
export const NINE_DIGITS = 1e-9;

/** Holds a value to its expected one by a share of the latter's size. */
export function expectNear(
  actual: number | null | undefined,
  expected: number,
  relative: number,
  what = '',
): void {
  expect(actual, what).toEqual(expect.any(Number));
  const apart = Math.abs((actual ?? Number.NaN) - expected);
  const allowed = relative * Math.abs(expected);
  expect(apart, `${what} ${actual} against ${expected}, allowed ${allowed}`).toBeLessThanOrEqual(allowed);
}

/** Holds a value to a figure printed with that many decimals: half a unit of the last, and the double's own rounding. */
export function expectPrinted(
  actual: number | null | undefined,
  printed: number,
  decimals: number,
  what = '',
): void {
  expect(actual, what).toEqual(expect.any(Number));
  const apart = Math.abs((actual ?? Number.NaN) - printed);
  const allowed = 0.5 * 10 ** -decimals * (1 + 1e-9) + 1e-12 * Math.abs(printed);
  expect(apart, `${what} ${actual} against ${printed} printed to ${decimals} decimals`).toBeLessThanOrEqual(
    allowed,
  );
}
