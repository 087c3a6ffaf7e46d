import { useMemo } from 'react';
import type { Plan } from '#shared/core/plan.ts';
import type { Trial, TrialResult, TrialRun, TrialTerms } from '#shared/core/wood-trial.ts';
import type { DrawSettings } from './draws/settings.ts';
import type { DrawLimits } from './draws/tasks.ts';
import { trimmedPlan } from './draws/trimmed-plan.ts';
import { useChances } from './draws/use-chances.ts';
import { chanceText } from './draws/words.ts';

/** What was tried, and what it came to. */
export interface Tried {
  plan: Plan;
  run: TrialRun;
  terms: TrialTerms;
  /** as drawn first */
  tried: readonly Trial[];
}

/** The plan as a trial would have it built: in its woods, with the weights that trim it and fill it up. */
export function builtAs(
  plan: Plan,
  trial: Trial,
  { ballast, added, allUp }: Pick<TrialResult, 'ballast' | 'added' | 'allUp'>,
  { arm, wanted }: { arm: number; wanted: number | null },
): Plan | null {
  if (allUp === null || wanted === null) return null;
  return trimmedPlan(plan, trial, [
    { mass: ballast ?? 0, x: arm },
    { mass: added ?? 0, x: wanted },
  ]);
}

/** The trials as models to draw, and in words the chance that each keeps the limits of mass and balance. */
export function useTrialChances({ plan, run, terms, tried }: Tried, settings: DrawSettings) {
  const plans = useMemo(
    () =>
      tried.map((trial, i) => {
        const result = run.results[i];
        return result ? builtAs(plan, trial, result, { arm: terms.arm, wanted: run.wanted }) : null;
      }),
    [plan, run, terms, tried],
  );
  const limits = useMemo((): DrawLimits => {
    const { target } = plan;
    return {
      mass: typeof terms.minimumMass === 'number' ? { min: terms.minimumMass } : undefined,
      percentMac: target && {
        min: target.percentMac - target.tolerance,
        max: target.percentMac + target.tolerance,
      },
    };
  }, [plan, terms]);
  const { chances } = useChances(plans, limits, settings);
  const models = [
    { name: 'As drawn', plan },
    ...tried.slice(1).flatMap(({ name }, i) => {
      const built = plans[i + 1];
      return built ? [{ name, plan: built }] : [];
    }),
  ];
  return { models, chances: chances.map((one) => (one?.all ? chanceText(one.all) : '')) };
}
