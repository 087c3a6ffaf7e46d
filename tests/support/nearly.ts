import { expect } from 'vitest';

/** Named relative tolerances, each with its reason. */
export const ROUNDING = 1e-9; // sums of doubles in another order
export const SAMPLED = 1e-6; // integrals by Gauss points or 200 section nodes
export const PRINTED = 5e-4; // a source prints four digits

/** Relative (absolute below 1) nearness with a tolerance that says where it comes from. */
export function expectNearly(actual: number | null | undefined, expected: number, tolerance: number): void {
  expect(actual, 'a number was expected').toBeTypeOf('number');
  const miss = Math.abs((actual ?? Number.NaN) - expected) / Math.max(1, Math.abs(expected));
  expect(miss, `${actual} is not within ${tolerance} of ${expected}`).toBeLessThanOrEqual(tolerance);
}
