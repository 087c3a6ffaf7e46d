import { normalQuantile } from './quantiles.ts';

/**
 * A repeatable stream of chance: the same seed gives the same numbers in every browser and at every time. Its state
 * is its own; two streams do not touch.
 */
export interface Random {
  /** fills an array with normal deviates of mean 0 and standard deviation 1 */
  fillNormal: (out: Float64Array) => void;
  /** fills an array with deviates that are even from −1 to 1 */
  fillEven: (out: Float64Array) => void;
}

/** A deviate is one of so many values, each as likely as the others. */
const VALUES = 65_536;

const valuesOf = (at: (chance: number) => number) =>
  Float64Array.from({ length: VALUES }, (_, i) => at((i + 0.5) / VALUES));

/**
 * Middles of equal parts of the normal distribution, widened to a standard deviation of exactly 1: from −4.3 to 4.3,
 * in steps far finer than any tolerance of wood. Half a draw of 32 bits picks one, which is several times as fast as
 * working one out.
 */
function normalValues(): Float64Array {
  const values = valuesOf(normalQuantile);
  const variance = values.reduce((sum, z) => sum + z * z, 0) / VALUES;
  return values.map((z) => z / Math.sqrt(variance));
}

let tables: { normal: Float64Array; even: Float64Array } | null = null;

/**
 * Small fast counting generator of 32 bits, sfc32 (C. Doty-Humphrey, PractRand, public domain; period 2¹²⁷ on
 * average, 2³² at least). A seed is a whole number; only its last 32 bits count.
 * @example (four = new Float64Array(4), randomOf(7).fillEven(four), [...four].every((v) => Math.abs(v) < 1)) // → true
 */
export function randomOf(seed: number): Random {
  tables ??= { normal: normalValues(), even: valuesOf((chance) => 2 * chance - 1) };
  const { normal, even } = tables;
  const state = Int32Array.of(0, seed, 0, 1);
  const fill = (out: Float64Array, values: Float64Array) => {
    let a = state[0] ?? 0;
    let b = state[1] ?? 0;
    let c = state[2] ?? 0;
    let counter = state[3] ?? 0;
    const last = out.length - 1;
    for (let i = 0; i <= last; i += 2) {
      const draw = (a + b + counter) | 0;
      counter = (counter + 1) | 0;
      a = b ^ (b >>> 9);
      b = (c + (c << 3)) | 0;
      c = (((c << 21) | (c >>> 11)) + draw) | 0;
      out[i] = values[draw & 0xffff] ?? 0;
      if (i < last) out[i + 1] = values[draw >>> 16] ?? 0;
    }
    state[0] = a;
    state[1] = b;
    state[2] = c;
    state[3] = counter;
  };
  // The first draws still show the seed; the author's own seeding throws twelve away.
  fill(new Float64Array(24), even);
  return { fillNormal: (out) => fill(out, normal), fillEven: (out) => fill(out, even) };
}
