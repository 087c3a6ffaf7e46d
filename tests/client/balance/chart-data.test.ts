import { describe, expect, it } from 'vitest';
import ploverJson from '#data/demo/gliders/plover.json' with { type: 'json' };
import { doubtBars, massBars, momentBars } from '#client/features/balance/chart-data.ts';
import { estimate } from '#shared/core/estimate.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const plan = planSchema.parse(ploverJson);
const result = estimate(plan);
const total = (bars: readonly { value: number }[]) => bars.reduce((sum, { value }) => sum + value, 0);

describe('bars of the balance charts', () => {
  it('share out the whole mass, heaviest first', () => {
    const bars = massBars(plan, result);
    expect(total(bars)).toBeCloseTo(result.totals.mass, 9);
    expect(bars.map(({ value }) => value)).toEqual(bars.map(({ value }) => value).toSorted((a, b) => b - a));
  });

  it('cancel about the balance point and leave M·d about a point d ahead of it', () => {
    const x = result.balance.x ?? Number.NaN;
    expect(total(momentBars(plan, result, x))).toBeCloseTo(0, 6);
    expect(total(momentBars(plan, result, x - 3))).toBeCloseTo(3 * result.totals.mass, 6);
  });

  it('make up the whole uncertainty in quadrature, what is small as one bar', () => {
    for (const [of, whole] of [
      ['mass', result.totals.u],
      ['balance', result.balance.u],
    ] as const) {
      const { bars, all } = doubtBars(plan, result, of);
      expect(Math.hypot(...bars.map(({ value }) => value))).toBeCloseTo(whole ?? Number.NaN, 9);
      expect(bars.at(-1)?.name).toBe(`${all.length - 7} others together`);
    }
  });

  it('tell parts of one name apart by their surface', () => {
    const names = doubtBars(plan, result, 'mass').bars.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });
});
