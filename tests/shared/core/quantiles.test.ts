import fc from 'fast-check';
import { quantileSorted, sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { histogramOf, normalQuantile, quantileOf, spreadOf } from '#shared/core/quantiles.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
const sortedOf = (values: readonly number[]) => values.toSorted((a, b) => a - b);

/** Share of the normal distribution below z, by Simpson's rule over its bell. */
function normalShare(z: number): number {
  const [from, steps] = [-12, 20_000];
  const width = (z - from) / steps;
  let sum = 0;
  for (let i = 0; i <= steps; i++) {
    const x = from + i * width;
    sum += Math.exp((-x * x) / 2) * (i === 0 || i === steps ? 1 : i % 2 ? 4 : 2);
  }
  return (sum * width) / 3 / Math.sqrt(2 * Math.PI);
}

describe('the quantile of the normal distribution', () => {
  it('is where the bell’s own area says, in the middle, on the flanks and where they meet', () => {
    for (const p of [1e-10, 1e-6, 7.6e-6, 0.001, 0.0749999, 0.0750001, 0.2, 0.5, 0.9, 0.99999]) {
      const share = normalShare(normalQuantile(p));
      expect(Math.abs(share / p - 1), `${p}`).toBeLessThan(1e-12);
    }
  });

  it('is as far on one side as on the other, and refuses what lies too far out', () => {
    for (const p of [0.01, 0.3, 0.4999]) expectNearly(normalQuantile(1 - p), -normalQuantile(p), 1e-12);
    for (const p of [0, 1, -1, 2, 1e-12, Number.NaN]) expect(() => normalQuantile(p)).toThrow(RangeError);
  });
});

describe('quantiles of values', () => {
  it('lie between the values next to them, least and most at the ends', () => {
    fc.assert(
      fc.property(
        fc.array(value, { minLength: 1, maxLength: 30 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (list, p) => {
          const sorted = sortedOf(list);
          const place = p * (sorted.length - 1);
          const quantile = quantileOf(sorted, p)!;
          expect(quantile).toBeGreaterThanOrEqual(sorted[Math.floor(place)]!);
          expect(quantile).toBeLessThanOrEqual(sorted[Math.ceil(place)]! + 1e-9 * Math.abs(quantile));
          expect(quantileOf(sorted, 0)).toBe(sorted[0]);
          expect(quantileOf(sorted, 1)).toBe(sorted.at(-1));
        },
      ),
      { seed: 5 },
    );
    expect(quantileOf([], 0.5)).toBeNull();
  });

  it('have the median that another library finds', () => {
    const list = sortedOf([3, 11, 5, 7, 2, 13]);
    expect(quantileOf(list, 0.5)).toBe(quantileSorted(list, 0.5));
  });
});

describe('the spread of values', () => {
  it('is that of another library, and none of one value', () => {
    const list = [3, 11, 5, 7, 2, 13];
    expectNearly(spreadOf(list)?.u, sampleStandardDeviation(list), ROUNDING);
    expect(spreadOf([3])).toBeNull();
  });
});

describe('a histogram', () => {
  it('counts each value once, in columns that meet and hold it', () => {
    fc.assert(
      fc.property(fc.array(value, { maxLength: 60 }), fc.integer({ min: 1, max: 40 }), (list, wanted) => {
        const sorted = sortedOf(list);
        const bins = histogramOf(sorted, wanted);
        expect(bins.reduce((sum, { count }) => sum + count, 0)).toBe(list.length);
        for (const [i, { from, to, count }] of bins.entries()) {
          const slack = 1e-8 * (Math.abs(from) + Math.abs(to));
          const held = sorted.filter((v) => v >= from - slack && v <= to + slack).length;
          expect(count).toBeLessThanOrEqual(held);
          if (bins[i + 1]) expectNearly(bins[i + 1]!.from, to, ROUNDING);
        }
      }),
      { seed: 7 },
    );
  });

  it('has about as many columns as are wanted, with edges to count in', () => {
    const values = Array.from({ length: 1000 }, (_, i) => 118.3 + i * 0.0071);
    const bins = histogramOf(values, 30);
    expect(bins.length).toBeGreaterThan(12);
    expect(bins.length).toBeLessThanOrEqual(31);
    for (const { from } of bins) expectNearly(from * 2, Math.round(from * 2), ROUNDING);
  });

  it('is one column of values that are all one, and empty of none', () => {
    expect(histogramOf([7, 7, 7])).toEqual([{ from: 7, to: 7, count: 3 }]);
    expect(histogramOf([])).toEqual([]);
  });
});
