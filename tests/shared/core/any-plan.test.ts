import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { estimate as estimateSchema } from '#shared/schemas/estimate.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';

// Thousands of plans take seconds on a busy machine; this bounds a hang, it measures nothing.
describe('any plan that the schema accepts', { timeout: 120_000 }, () => {
  it('gets an answer of finite numbers and nulls, and never throws', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        expect(planSchema.safeParse(plan).error?.issues ?? []).toEqual([]);
        const result = estimate(plan);
        expect(estimateSchema.safeParse(result).error?.issues ?? []).toEqual([]);
      }),
      { numRuns: 1500, seed: 19 },
    );
  });

  it('has totals that are the sums of its lines', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const { lines, totals } = estimate(plan);
        const mass = lines.reduce((sum, line) => sum + line.mass, 0);
        expectNearly(totals.mass, mass, ROUNDING);
        const groups = Object.values(totals.byGroup).reduce((sum, m) => sum + m, 0);
        expectNearly(groups, mass, ROUNDING);
        for (const line of lines) expect(line.mass).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 200, seed: 23 },
    );
  });
});
