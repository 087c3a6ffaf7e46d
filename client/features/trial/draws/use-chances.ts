import { useMemo, useState } from 'react';
import { same } from '#client/lib/same.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { DrawSettings } from './settings.ts';
import type { Chances, ChancesTask, DrawLimits } from './tasks.ts';
import { useDrawing } from './use-drawing.ts';

/** Of each plan the chance of keeping the limits. */
export interface ChancesState {
  /** in the order of the plans; null where there is no plan, no limit, or no draw yet */
  chances: readonly (Chances | null)[];
  /** drawn from other plans or limits than those asked, which are being drawn */
  working: boolean;
  problem: string | null;
}

/**
 * The chance that a model comes out within limits of mass and balance, for each of several plans: say of trials,
 * each with its woods and the ballast that trims it; null for one that cannot be trimmed. Drawn in the worker, so
 * the answer comes a moment later; with the settings of `useDrawSettings`, so that it agrees with the draws shown.
 */
export function useChances(
  plans: readonly (Plan | null)[],
  limits: DrawLimits,
  settings: DrawSettings,
): ChancesState {
  const asked = useSame({ plans, limits, settings });
  const bound = hasBound(asked.limits.mass) || hasBound(asked.limits.percentMac);
  const task = useMemo(
    (): ChancesTask | null => (bound && asked.plans.length > 0 ? { of: 'chances', ...asked } : null),
    [asked, bound],
  );
  const { answer, working, problem } = useDrawing(task);
  return {
    // Of other plans than these are the chances of before: better none than those of a neighbour.
    chances: plans.map((_, i) => (answer?.length === plans.length ? (answer[i] ?? null) : null)),
    working,
    problem,
  };
}

const hasBound = (bounds: DrawLimits['mass']) => bounds?.min !== undefined || bounds?.max !== undefined;

/** The object of before as long as the new one says the same. */
function useSame<T>(value: T): T {
  const [held, setHeld] = useState(value);
  if (held === value || same(held, value)) return held;
  setHeld(value);
  return value;
}
