/** What a scale said of one thing: the same thing put on it once or several times. Masses g. */
export interface Readings {
  /** as shown, tare not taken off */
  values: readonly number[];
  /** what stood on the scale beside it */
  tare: number;
  /** smallest step that the scale shows */
  resolution: number;
}

/** A mass, g, with its standard uncertainty. */
export interface Reading {
  mass: number;
  u: number;
}

/** Standard deviation of what is spread evenly over a step of 1 (JCGM 100:2008, 4.3.7). */
const EVEN = 1 / Math.sqrt(12);

/**
 * Mean of the readings less the tare, and its standard uncertainty: the scatter of the mean (type A, JCGM 100:2008,
 * 4.2.3) beside one step of the scale for the reading and one for the tare or the zero (type B, F.2.2.1: step/√12
 * each). Repeats do not make the scale's own step smaller. Null without a reading.
 * @example readingOf({ values: [3.2, 3.1, 3.3], tare: 0.2, resolution: 0.1 }).mass.toFixed(3) // → '3.000'
 * @example readingOf({ values: [3], tare: 0, resolution: 0.1 }).u.toFixed(4) // → '0.0408'
 * @example readingOf({ values: [], tare: 0, resolution: 0.1 }) // → null
 */
export function readingOf({ values, tare, resolution }: Readings): Reading | null {
  const n = values.length;
  if (n === 0) return null;
  const mean = values.reduce((sum, value) => sum + value, 0) / n;
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  const ofMean = n > 1 ? squares / (n - 1) / n : 0;
  return { mass: mean - tare, u: Math.sqrt(ofMean + 2 * (resolution * EVEN) ** 2) };
}
