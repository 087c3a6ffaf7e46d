import type { Limit } from './limit.ts';
import { judge, type Measured, type MeasuredFor, type Verdict } from './verdict.ts';

/** What was measured of an entry: g, dm² and mm. What was not measured is null. */
export interface EntryMeasures {
  lightest: Measured | null;
  heaviest: Measured | null;
  withoutBattery: Measured | null;
  /** where area varies in flight; equal where it does not */
  smallest: { wing: Measured | null; wing_and_tail: Measured | null };
  largest: { wing: Measured | null; wing_and_tail: Measured | null };
  span: Measured | null;
  noseRadius: Measured | null;
}

/** A limit with its verdict; `missing` where what it judges was not measured. */
export type LimitVerdict = { limit: Limit } & ({ missing: true } | ({ missing: false } & Verdict));

/**
 * An entry against the limits of its class. The lightest set-up with the largest area is held to least masses and
 * loadings, the heaviest with the smallest area to greatest ones (common practice, no source), so that every set-up
 * that may be flown is inside.
 * @example judgeEntry([{ quantity: 'span', bound: 'max', value: '1500', unit: 'mm', inclusive: true, areaBasis: 'wing', massBasis: 'extreme' }], { ...NOTHING_MEASURED, span: { value: '1500', u: 0 } }, { k: 0, step: '0.1' })[0].verdict // → 'inside'
 */
export function judgeEntry(
  limits: readonly Limit[],
  measures: EntryMeasures,
  terms: { k: number; step: string },
): LimitVerdict[] {
  return limits.map((limit) => {
    const measured = measuredFor(limit, measures);
    return measured ? { limit, missing: false, ...judge(limit, measured, terms) } : { limit, missing: true };
  });
}

/** What `judgeEntry` is given where nothing was measured yet. */
export const NOTHING_MEASURED: EntryMeasures = {
  lightest: null,
  heaviest: null,
  withoutBattery: null,
  smallest: { wing: null, wing_and_tail: null },
  largest: { wing: null, wing_and_tail: null },
  span: null,
  noseRadius: null,
};

function measuredFor(limit: Limit, measures: EntryMeasures): MeasuredFor | null {
  const { quantity, bound, areaBasis, massBasis } = limit;
  const extreme = bound === 'min' ? measures.lightest : measures.heaviest;
  const mass = massBasis === 'without_battery' ? measures.withoutBattery : extreme;
  switch (quantity) {
    case 'mass':
      return mass && { quantity, value: mass };
    case 'loading': {
      const area = (bound === 'min' ? measures.largest : measures.smallest)[areaBasis];
      return mass && area && { quantity, mass, area };
    }
    case 'area': {
      const area = (bound === 'min' ? measures.smallest : measures.largest)[areaBasis];
      return area && { quantity, value: area };
    }
    case 'span':
      return measures.span && { quantity, value: measures.span };
    case 'nose_radius':
      return measures.noseRadius && { quantity, value: measures.noseRadius };
  }
}
