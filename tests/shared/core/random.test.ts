import { describe, expect, it } from 'vitest';
import { normalQuantile } from '#shared/core/quantiles.ts';
import { randomOf } from '#shared/core/random.ts';

const DRAWS = 400_000;
const normals = (seed: number, count = DRAWS) => {
  const out = new Float64Array(count);
  randomOf(seed).fillNormal(out);
  return out;
};
const evens = (seed: number, count = DRAWS) => {
  const out = new Float64Array(count);
  randomOf(seed).fillEven(out);
  return out;
};
const momentOf = (values: Float64Array, power: number) =>
  values.reduce((sum, v) => sum + v ** power, 0) / values.length;

describe('the stream of chance', () => {
  it('is the same from the same seed and another from another', () => {
    expect(normals(5, 99)).toEqual(normals(5, 99));
    expect(normals(5, 99)).not.toEqual(normals(6, 99));
    // Only the last 32 bits of a seed count.
    expect(normals(2 ** 32 + 5, 99)).toEqual(normals(5, 99));
  });

  it('does not touch another stream, and goes on from fill to fill', () => {
    const [one, other] = [randomOf(5), randomOf(5)];
    const [a, b] = [new Float64Array(8), new Float64Array(8)];
    one.fillNormal(a.subarray(0, 4));
    randomOf(5).fillEven(new Float64Array(6));
    one.fillNormal(a.subarray(4));
    other.fillNormal(b);
    expect(a).toEqual(b);
  });

  // A mean of n values scatters by σ/√n; five times that is past chance.
  it('has normal deviates with the moments of the normal distribution', () => {
    const values = normals(11);
    for (const [power, moment, spread] of [
      [1, 0, 1],
      [2, 1, Math.sqrt(2)],
      [3, 0, Math.sqrt(15)],
      [4, 3, Math.sqrt(96)],
    ] as const) {
      const miss = Math.abs(momentOf(values, power) - moment);
      expect(miss, `moment ${power}`).toBeLessThan((5 * spread) / Math.sqrt(DRAWS));
    }
  });

  it('has as many normal deviates below each quantile as there should be', () => {
    const values = normals(12);
    for (const p of [0.001, 0.01, 0.1, 0.25, 0.5, 0.75, 0.9, 0.99, 0.999]) {
      const below = values.filter((v) => v < normalQuantile(p)).length / DRAWS;
      expect(Math.abs(below - p), `${p}`).toBeLessThan(5 * Math.sqrt((p * (1 - p)) / DRAWS));
    }
  });

  it('has even deviates that fill every twentieth of −1 to 1 alike', () => {
    const counts = Array.from({ length: 20 }, () => 0);
    for (const value of evens(13)) {
      const at = Math.floor((value + 1) * 10);
      counts[at] = (counts[at] ?? 0) + 1;
    }
    const expected = DRAWS / 20;
    const chiSquare = counts.reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0);
    expect(counts).toHaveLength(20);
    // χ² of 19 degrees of freedom: above 50.8 or below 4.1 once in ten thousand times (from memory).
    expect(chiSquare).toBeLessThan(50.8);
    expect(chiSquare).toBeGreaterThan(4.1);
  });

  it('has neighbours and halves of one draw that do not go together', () => {
    const values = normals(14);
    for (const step of [1, 2, 3, 7]) {
      let product = 0;
      for (let i = step; i < values.length; i++) product += (values[i] ?? 0) * (values[i - step] ?? 0);
      expect(Math.abs(product / DRAWS), `step ${step}`).toBeLessThan(5 / Math.sqrt(DRAWS));
    }
  });
});
