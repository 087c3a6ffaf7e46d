import { liftsOf } from './flight-points.ts';
import { planformOf } from './planform.ts';
import type { Plan } from './plan.ts';
import { surfaceLine } from './stations.ts';

/** The wing that balance and loading are told by: all surfaces of the role `wing` together. */
export interface WingReference {
  /** mm², projected */
  area: number;
  /** mean aerodynamic chord, mm */
  mac: number;
  /** leading edge of the MAC, mm aft of the datum */
  xLeMac: number;
}

/**
 * Mean aerodynamic chord and area of a plan's wing, as the estimate takes them; null without a wing, or where it
 * casts no shadow.
 * @example wingReference(EXAMPLE_PLAN) // → { area: 100_000, mac: 100, xLeMac: 0 }
 */
export function wingReference(plan: Pick<Plan, 'surfaces'>): WingReference | null {
  const lifts = liftsOf(
    plan.surfaces.map((surface) => {
      const line = surfaceLine(surface);
      return { surface, line, planform: planformOf(surface, line) };
    }),
  );
  return lifts && { area: lifts.wingArea, mac: lifts.mac, xLeMac: lifts.xLeMac };
}
