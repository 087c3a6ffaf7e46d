/**
 * Coefficients of algorithm AS 241, PPND16 (M. J. Wichura, "The percentage points of the normal distribution",
 * Applied Statistics 37 (1988), 477–484), as doubles, highest power first, for the middle and for the flanks.
 */
const MIDDLE = [
  [
    2509.0809287301227, 33430.57558358813, 67265.7709270087, 45921.95393154987, 13731.69376550946,
    1971.5909503065513, 133.14166789178438, 3.3871328727963665,
  ],
  [
    5226.495278852854, 28729.085735721943, 39307.89580009271, 21213.794301586597, 5394.196021424751,
    687.1870074920579, 42.31333070160091, 1,
  ],
] as const;
const FLANK = [
  [
    0.0007745450142783414, 0.022723844989269184, 0.2417807251774506, 1.2704582524523684, 3.6478483247632045,
    5.769497221460691, 4.630337846156546, 1.4234371107496835,
  ],
  [
    1.0507500716444169e-9, 0.0005475938084995345, 0.015198666563616457, 0.14810397642748008, 0.6897673349851,
    1.6763848301838038, 2.053191626637759, 1,
  ],
] as const;

function ratio([above, below]: readonly [readonly number[], readonly number[]], r: number): number {
  const at = (powers: readonly number[]) => powers.reduce((sum, c) => sum * r + c, 0);
  return at(above) / at(below);
}

/**
 * The value that a normal deviate (mean 0, standard deviation 1) stays below with a chance of `p`, to sixteen digits
 * for p from 1.4e-11 to its mirror image.
 * @throws RangeError for a chance beyond these
 * @example normalQuantile(0.5) // → 0
 * @example normalQuantile(0.975) // → 1.959963984540054
 */
export function normalQuantile(p: number): number {
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * ratio(MIDDLE, 0.180625 - q * q);
  const r = Math.sqrt(-Math.log(Math.min(p, 1 - p)));
  if (!(r <= 5)) throw new RangeError(`a chance of ${p} lies too far out`);
  return Math.sign(q) * ratio(FLANK, r - 1.6);
}

/**
 * The value that a share `p` of sorted values lies below, by straight lines between them (definition 7 of R. J.
 * Hyndman and Y. Fan, "Sample quantiles in statistical packages", American Statistician 50 (1996)). Null for none.
 * @example quantileOf([1, 2, 3, 10], 0.5) // → 2.5
 */
export function quantileOf(sorted: ArrayLike<number>, p: number): number | null {
  if (sorted.length === 0) return null;
  const place = Math.min(1, Math.max(0, p)) * (sorted.length - 1);
  const below = Math.floor(place);
  const [a, b] = [sorted[below] ?? 0, sorted[Math.min(below + 1, sorted.length - 1)] ?? 0];
  return a + (place - below) * (b - a);
}

/** Mean and standard deviation of some values. */
export interface Spread {
  mean: number;
  u: number;
}

/**
 * Mean and standard deviation (with n − 1); null for fewer than two values.
 * @example spreadOf([1, 3]) // → { mean: 2, u: 1.4142135623730951 }
 */
export function spreadOf(values: ArrayLike<number>): Spread | null {
  const n = values.length;
  if (n < 2) return null;
  let sum = 0;
  for (let i = 0; i < n; i++) sum += values[i] ?? 0;
  const mean = sum / n;
  let square = 0;
  for (let i = 0; i < n; i++) square += ((values[i] ?? 0) - mean) ** 2;
  return { mean, u: Math.sqrt(square / (n - 1)) };
}

/** One column of a histogram: values from `from` on that stay below `to`. */
export interface Bin {
  from: number;
  to: number;
  count: number;
}

/** Steps that a reader can count in: 1, 2 or 5 times a power of ten. */
function roundStep(step: number): number {
  const power = 10 ** Math.floor(Math.log10(step));
  return power * ([1, 2, 5].find((n) => n * power >= step * (1 - 1e-9)) ?? 10);
}

/**
 * Counts of sorted values in about `wanted` columns with round edges, as a chart or a table; the last column holds
 * its upper edge. One column where all values are one; none where there are none.
 * @example histogramOf([1, 2, 2, 3], 2) // → [{ from: 1, to: 2, count: 1 }, { from: 2, to: 3, count: 3 }]
 */
export function histogramOf(sorted: ArrayLike<number>, wanted = 30): Bin[] {
  const [least, most] = [sorted[0], sorted[sorted.length - 1]];
  if (least === undefined || most === undefined) return [];
  const range = most - least;
  // Values that differ by their last digits only cannot be told apart on any axis.
  if (range <= 1e-12 * Math.max(Math.abs(least), Math.abs(most))) {
    return [{ from: least, to: most, count: sorted.length }];
  }
  const step = roundStep(range / wanted);
  const first = Math.floor(least / step + 1e-9);
  const columns = Math.max(1, Math.ceil(most / step - 1e-9) - first);
  const counts = Array.from({ length: columns }, () => 0);
  for (let i = 0; i < sorted.length; i++) {
    const column = Math.min(columns - 1, Math.max(0, Math.floor((sorted[i] ?? 0) / step - first + 1e-9)));
    counts[column] = (counts[column] ?? 0) + 1;
  }
  return counts.map((count, i) => ({ from: (first + i) * step, to: (first + i + 1) * step, count }));
}
