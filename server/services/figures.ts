import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { planOutline } from '#shared/drawing/outline.ts';
import type { GliderFigures } from '#shared/schemas/glider.ts';

/** The headline figures of an estimate. */
export function figuresOf({ totals, balance, loading }: Estimate): GliderFigures {
  return { mass: totals.mass, percentMac: balance.percentMac, wingLoading: loading.wing };
}

/** What is kept beside a glider's plan, so that a list of gliders computes nothing. */
export interface Headline extends GliderFigures {
  /** mm aft of the datum */
  balance: number | null;
  outline: [number, number][];
}

export function headlineOf(plan: Plan, result: Estimate): Headline {
  return { ...figuresOf(result), balance: result.balance.x, outline: planOutline(plan) };
}
