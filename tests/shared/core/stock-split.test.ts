import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { divideMeasure, shareMass } from '#shared/core/stock-split.ts';

describe('dividing a measure by cuts', () => {
  it('leaves what lies behind the last cut', () => {
    expect(divideMeasure({ whole: 914.4, wanted: [300, 200], kerf: 1.5 })).toEqual({
      pieces: [300, 200, 411.4],
    });
  });

  it('leaves nothing where the last cut runs off the end, or none is needed', () => {
    expect(divideMeasure({ whole: 100, wanted: [49.5, 49.5], kerf: 1 })).toEqual({ pieces: [49.5, 49.5] });
    expect(divideMeasure({ whole: 100, wanted: [49, 49.5], kerf: 1 })).toEqual({ pieces: [49, 49.5] });
    expect(divideMeasure({ whole: 100, wanted: [100], kerf: 1 })).toEqual({ pieces: [100] });
  });

  it('takes measures that came from inches for what they are', () => {
    const foot = 12 * 25.4;
    expect(foot * 3).not.toBe(914.4);
    expect(divideMeasure({ whole: 914.4, wanted: [foot, foot, foot], kerf: 0 })).toEqual({
      pieces: [foot, foot, foot],
    });
  });

  it('says by how much the whole is too short', () => {
    expect(divideMeasure({ whole: 100, wanted: [60, 45], kerf: 2 })).toEqual({ missing: 7 });
  });
});

describe('sharing a mass out by volume', () => {
  const figure = (max: number) => fc.double({ min: 1e-3, max, noNaN: true });
  const cuts = fc.record({
    mass: figure(1_000).map((mass) => Number(mass.toPrecision(12))),
    volumes: fc.array(figure(1e6), { minLength: 1, maxLength: 50 }),
    lost: fc.oneof(fc.constant(0), figure(1e5)),
  });

  it('adds up with the loss to the whole, to the last digit', () => {
    fc.assert(
      fc.property(cuts, ({ mass, volumes, lost }) => {
        const whole = volumes.reduce((sum, volume) => sum + volume, lost);
        const shared = shareMass(mass, volumes, whole);
        const sum = Decimal.sum(shared.lost ?? Number.NaN, ...shared.masses.map((one) => one ?? 0));
        expect(sum.toNumber()).toBe(mass);
        expect(sum.equals(mass)).toBe(true);
      }),
      { numRuns: 1_000 },
    );
  });

  it('gives each piece its share, good to twelve digits of the whole, and loses nothing without a loss', () => {
    fc.assert(
      fc.property(cuts, ({ mass, volumes, lost }) => {
        const whole = volumes.reduce((sum, volume) => sum + volume, lost);
        const shared = shareMass(mass, volumes, whole);
        for (const [i, one] of shared.masses.entries()) {
          expect(Math.abs((one ?? 0) - (mass * volumes[i]!) / whole)).toBeLessThan(mass * 2e-11);
        }
        expect(shared.lost).toBeGreaterThanOrEqual(0);
        if (lost === 0) expect(shared.lost).toBeLessThan(mass * 2e-11);
      }),
      { numRuns: 1_000 },
    );
  });

  it('is exact where the shares are', () => {
    expect(shareMass(17.7, [250, 250, 490], 1000)).toEqual({ masses: [4.425, 4.425, 8.673], lost: 0.177 });
  });

  it('knows no mass of what was not weighed, nor of what is too small for the digits', () => {
    expect(shareMass(null, [1, 2], 3)).toEqual({ masses: [null, null], lost: null });
    expect(shareMass(5, [1e-9, 1e9], 1e9)).toEqual({ masses: [null, 5], lost: 0 });
  });
});
