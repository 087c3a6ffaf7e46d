import { noseOf } from '#shared/core/extent.ts';
import type { Plan } from '#shared/core/plan.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';

/** Where the plan's foremost ballast lies, or else the nose: mm aft of the datum. */
export function usualArm(plan: Plan): number {
  const arms = plan.items.filter(isBallast).map(({ at }) => at[0]);
  return arms.length > 0 ? Math.min(...arms) : (noseOf(plan)?.[0] ?? 0);
}
