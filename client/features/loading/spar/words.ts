import { formatNumber } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** Strength figures hold to about a third (materials table): a margin below this may be none. */
const CLOSE = 1.5;

export type SparStanding = 'inside' | 'close' | 'outside';

/** Outside where the strips are over their strength as reckoned, close where the spread of strength may take them there. */
export function sparStanding(margin: number): SparStanding {
  if (margin < 1) return 'outside';
  return margin < CLOSE ? 'close' : 'inside';
}

/** A margin as it is told: more digits than it deserves help nobody, but one under 1 must not read as 1. */
export function marginText(margin: number | null): string {
  if (margin === null) return formatNumber(null, 1);
  if (margin < 1) return formatNumber(Math.floor(margin * 100) / 100, 2);
  return margin >= 100 ? 'over 100' : formatNumber(margin, 1);
}

/** A load factor: `6 g`, `7.3 g`. */
export function loadFactorText(n: number | null): string {
  if (n === null) return formatNumber(null, 1);
  const whole = Math.abs(n - Math.round(n)) < 0.005;
  return `${formatNumber(n, whole ? 0 : 1)}\u202fg`;
}

/** Where a station lies, as said in a sentence. */
export function placeText(s: number, units: Units): string {
  return s < 0.5 ? 'at the root' : `${units.format(s, 'length')} from the root`;
}
