import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import reference from '#data/reference/uncertainty.json';
import { compareWithForecast, likelyCauses } from '#shared/core/field/compare-forecast.ts';
import { supportsAccount } from '#shared/core/field/supports-account.ts';
import { windSteps } from '#shared/core/field/wind-ballast.ts';
import { supportsUncertainty, type Support } from '#shared/core/supports.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

const front: Support = { reading: 90, tare: 0, x: 40 };
const rear: Support = { reading: 30, tare: 0, x: 200 };
// 120 g at 80 mm.
const pair = [front, rear];
const u = { mass: 0.1, x: 0.5 };
const battery = { id: 'battery', mass: 12, at: [-80, 0, 0] as const };
const expected = { mass: { value: 120, u: 1 }, x: { value: 80, u: 1 }, items: [battery] };

describe('a model on its supports', () => {
  it('balances fore-and-aft and sideways, each place with its own doubt', () => {
    const account = supportsAccount([
      { reading: 60, tare: 0, x: 100, y: -300, u: 0.1, ux: 0.5, uy: 1 },
      { reading: 60, tare: 0, x: 100, y: 300, u: 0.1, ux: 0.5, uy: 1 },
    ]);
    expect(account).toMatchObject({ mass: 120, x: 100, y: 0 });
    expectNearly(account?.uy, Math.sqrt(2 * (2.5 * 0.1) ** 2 + 2 * 0.5 ** 2), ROUNDING);
    expectNearly(account?.ux, Math.sqrt(2 * 0.25 ** 2), ROUNDING);
  });

  it(`agrees with equal doubts on every support (${reference.twoSupports.source})`, () => {
    const u2 = supportsUncertainty(pair, 0.05, 1);
    const each = pair.map((s) => ({ ...s, u: 0.05, ux: 1 }));
    expectNearly(supportsAccount(each)?.ux, u2 ?? Number.NaN, ROUNDING);
  });

  it('is null where nothing stands on it, or less than nothing', () => {
    expect(supportsAccount([])).toBeNull();
    expect(supportsAccount([{ reading: 1, tare: 3, x: 0, u: 0.1 }])).toBeNull();
  });
});

describe('a weighing against its forecast', () => {
  it('is questioned beyond twice the joint uncertainty, either way', () => {
    for (const sign of [-1, 1]) {
      const at = (value: number) =>
        compareWithForecast({ value: 80 + sign * value, u: 0.6 }, { value: 80, u: 0.8 });
      expect(at(1.99).verdict).toBe('agrees');
      expect(at(2.01).verdict).toBe('questioned');
    }
    expect(compareWithForecast({ value: 1, u: 0 }, { value: 1, u: 0 }).verdict).toBe('agrees');
    expect(compareWithForecast({ value: 1, u: 0 }, { value: 2, u: 0 })).toMatchObject({ multiples: null });
  });

  it('asks for nothing where it agrees', () => {
    expect(likelyCauses(pair, u, expected)).toEqual([]);
  });

  it('sees readings that were swapped', () => {
    const swapped = [
      { ...front, reading: 30 },
      { ...rear, reading: 90 },
    ];
    expect(likelyCauses(swapped, u, expected)[0]).toEqual({ code: 'readings_swapped' });
  });

  it('sees a battery left at home', () => {
    // Without 12 g at −80 mm: 108 g at 97.78 mm.
    const x = (120 * 80 + 12 * 80) / 108;
    const light = [
      { ...front, reading: (108 * (200 - x)) / 160 },
      { ...rear, reading: (108 * (x - 40)) / 160 },
    ];
    expect(likelyCauses(light, u, expected)[0]).toEqual({ code: 'item_missing', id: 'battery' });
  });

  it('sees a stand that was not tared', () => {
    const causes = likelyCauses([{ ...front, reading: 115 }, rear], u, expected);
    expect(causes[0]).toEqual({ code: 'tare_forgotten', support: 0 });
  });

  it('sees places that were measured in inches', () => {
    const inches = pair.map((s) => ({ ...s, x: s.x / 25.4 }));
    expect(likelyCauses(inches, u, expected)[0]).toEqual({ code: 'places_in_inches' });
  });

  it('names how far the datum would have to lie off where the mass is right', () => {
    const shifted = pair.map((s) => ({ ...s, x: s.x - 10 }));
    expect(likelyCauses(shifted, u, expected)).toEqual([{ code: 'datum_shifted', by: 10 }]);
  });
});

describe('wind ballast', () => {
  it('makes the model faster by the root of the mass, at every lift coefficient alike', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 500, noNaN: true }), (ballast) => {
        const [bare, heavy] = windSteps({ mass: 300, area: 250_000, clMax: 1.1, cl: 0.4, density: 1.2 }, [
          0,
          ballast,
        ]);
        expectNearly((heavy?.stall ?? 0) / (bare?.stall ?? 1), heavy?.faster ?? 0, ROUNDING);
        expectNearly((heavy?.trim ?? 0) / (bare?.trim ?? 1), heavy?.faster ?? 0, ROUNDING);
      }),
    );
  });
});
