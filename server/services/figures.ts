import type { Estimate } from '#shared/core/result.ts';
import type { GliderFigures } from '#shared/schemas/glider.ts';

/** The headline figures of an estimate. */
export function figuresOf({ totals, balance, loading }: Estimate): GliderFigures {
  return { mass: totals.mass, percentMac: balance.percentMac, wingLoading: loading.wing };
}
