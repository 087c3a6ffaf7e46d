import type { Target } from './plan.ts';

/** How a balance point stands to the range asked for. */
export type Standing = 'inside' | 'close' | 'outside';

/**
 * Outside where the balance point leaves the range asked for; close where one standard uncertainty (JCGM 100:2008)
 * would carry it over the edge; else inside. All in % of mean aerodynamic chord.
 * @example standingOf({ percentMac: 52, tolerance: 2 }, 53.6, 0.9) // → 'close'
 * @example standingOf({ percentMac: 52, tolerance: 2 }, 52.5, 0.9) // → 'inside'
 */
export function standingOf(target: Target, percentMac: number, u: number | null): Standing {
  const toEdge = target.tolerance - Math.abs(percentMac - target.percentMac);
  if (toEdge < 0) return 'outside';
  return u !== null && toEdge < u ? 'close' : 'inside';
}
