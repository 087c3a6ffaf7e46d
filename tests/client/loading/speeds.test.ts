import { describe, expect, it } from 'vitest';
import { areaRows } from '#client/features/loading/areas.ts';
import { overDensity, overLift, speedIn } from '#client/features/loading/speeds.ts';
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import { airAt } from '#shared/core/atmosphere.ts';
import { estimate } from '#shared/core/estimate.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const flown = { mass: 200, area: 180_000, mac: 120 };

describe('speed curves', () => {
  it('hold ρ·V² and C_L·V² the same all along', () => {
    const constant = overDensity(flown, 1, 0.5).map(({ x, stall }) => x * stall ** 2);
    for (const value of constant) expect(value).toBeCloseTo(constant[0] ?? Number.NaN, 9);
    const lift = overLift(flown, 1.2, 1.1).map(({ x, stall }) => x * stall ** 2);
    for (const value of lift) expect(value).toBeCloseTo(lift[0] ?? Number.NaN, 9);
  });

  it('trim faster than the stall by the root of the ratio of lift coefficients', () => {
    for (const { stall, trim } of overDensity(flown, 1.2, 0.3)) expect(trim).toBeCloseTo(2 * stall, 9);
  });

  it('end at the stall', () => {
    const air = airAt(500, 25);
    const last = overLift(flown, 1.1, air.density).at(-1);
    expect(last?.x).toBeCloseTo(1.1, 12);
    expect(last?.stall).toBeCloseTo(speedIn(flown, 1.1, air).speed ?? Number.NaN, 12);
  });

  it('have no speed without lift', () => {
    expect(speedIn(flown, 0, airAt(0))).toEqual({ speed: null, reynolds: null });
  });
});

describe('areaRows', () => {
  it('lays the wing flat to a larger area and a lighter loading, and agrees with the estimate', () => {
    const plan = planSchema.parse(whimbrelJson);
    const result = estimate(plan);
    const [projected, developed, classRow] = areaRows(plan, result);
    expect(projected?.loading).toBeCloseTo(result.loading.wing ?? Number.NaN, 9);
    expect(developed?.area).toBeGreaterThan(projected?.area ?? Number.POSITIVE_INFINITY);
    expect(developed?.loading).toBeLessThan(projected?.loading ?? Number.NEGATIVE_INFINITY);
    expect((classRow?.area ?? 0) / 10_000).toBeCloseTo(result.loading.classArea ?? Number.NaN, 9);
  });
});
