import type { CauseShares, Draws, Shares } from './draws.ts';
import { histogramOf, quantileOf, spreadOf, type Bin } from './quantiles.ts';

/** What a reader is told of many draws of one quantity, in its unit. */
export interface Summary {
  mean: number;
  u: number;
  quantiles: { share: number; value: number }[];
  histogram: Bin[];
}

/** Shares that quantiles are told at. */
export const QUANTILES = [0.01, 0.05, 0.25, 0.5, 0.75, 0.95, 0.99] as const;

/**
 * Mean, standard deviation, quantiles and a histogram of draws; null for fewer than two.
 * @example summaryOf([4, 2, 6])?.quantiles.find(({ share }) => share === 0.5) // → { share: 0.5, value: 4 }
 */
export function summaryOf(values: ArrayLike<number>, columns = 30): Summary | null {
  const spread = spreadOf(values);
  if (!spread) return null;
  const sorted = Float64Array.from(values).sort();
  return {
    ...spread,
    quantiles: QUANTILES.map((share) => ({ share, value: quantileOf(sorted, share) ?? 0 })),
    histogram: histogramOf(sorted, columns),
  };
}

/** A chance, 0–1, with the standard error that a limited number of draws leaves it. */
export interface Chance {
  share: number;
  standardError: number;
}

/** Bounds, both ends included; what is left out does not bind. */
export interface Bounds {
  min?: number | undefined;
  max?: number | undefined;
}

/**
 * The chance that all of several drawn quantities lie within their bounds at once: of the same length, draw by draw.
 * √(p(1−p)/n) is its standard error; with none or all within, that of half a draw is told instead of 0. Null for no
 * draws.
 * @example chanceWithin([{ values: [1, 2, 3, 4], min: 2, max: 3 }]) // → { share: 0.5, standardError: 0.25 }
 */
export function chanceWithin(limits: readonly (Bounds & { values: ArrayLike<number> })[]): Chance | null {
  const n = limits[0]?.values.length ?? 0;
  if (n === 0) return null;
  let inside = 0;
  for (let i = 0; i < n; i++) {
    const isIn = limits.every(({ values, min = -Infinity, max = Infinity }) => {
      const value = values[i] ?? Number.NaN;
      return value >= min && value <= max;
    });
    if (isIn) inside += 1;
  }
  const share = inside / n;
  const uncertain = Math.min(1 - 0.5 / n, Math.max(0.5 / n, share));
  return { share, standardError: Math.sqrt((uncertain * (1 - uncertain)) / n) };
}

/** Drawn standard deviation beside the one to first order. */
export interface Agreement {
  drawn: number;
  firstOrder: number;
  /** drawn over first order, less 1; null where the latter is 0 */
  apart: number | null;
  /** standard deviation of `apart` by the number of draws alone, 1/√(2n) */
  bySampling: number;
}

/**
 * How far draws and first-order propagation agree. More than some three times `bySampling` apart is no chance: the
 * spreads are so wide that the slopes do not tell the whole.
 * @example agreementOf([9, 11], 1.4142135623730951) // → { drawn: 1.4142135623730951, firstOrder: 1.4142135623730951, apart: 0, bySampling: 0.5 }
 */
export function agreementOf(values: ArrayLike<number>, firstOrder: number): Agreement | null {
  const spread = spreadOf(values);
  if (!spread) return null;
  return {
    drawn: spread.u,
    firstOrder,
    apart: firstOrder > 0 ? spread.u / firstOrder - 1 : null,
    bySampling: 1 / Math.sqrt(2 * values.length),
  };
}

/** What one material, or the items (null), adds to the variances. */
export interface MaterialShares {
  material: string | null;
  mass: Shares;
  balance: Shares;
}

/**
 * The causes' shares added up by material, what adds most to the mass first.
 * @example sharesByMaterial({ causes: [] }) // → []
 */
export function sharesByMaterial({ causes }: Pick<Draws, 'causes'>): MaterialShares[] {
  const add = (a: Shares, b: Shares): Shares => ({
    firstOrder: a.firstOrder + b.firstOrder,
    drawn: a.drawn + b.drawn,
  });
  const found = new Map<string | null, MaterialShares>();
  for (const { material, mass, balance } of causes satisfies readonly CauseShares[]) {
    const before = found.get(material);
    found.set(
      material,
      before
        ? { material, mass: add(before.mass, mass), balance: add(before.balance, balance) }
        : { material, mass, balance },
    );
  }
  return [...found.values()].sort((a, b) => b.mass.firstOrder - a.mass.firstOrder);
}
