import { useEffect, useState } from 'react';
import { estimate } from '#shared/core/estimate.ts';
import type { MergeChoice, PlanConflict } from '#shared/core/merge-fields.ts';
import type { Plan } from '#shared/core/plan.ts';
import { mergePlans } from '#shared/core/plan-merge.ts';
import { checkPlan } from './plan-check.ts';

/** Three plans that are to become one. */
export interface Sheets {
  base: Plan;
  mine: Plan;
  theirs: Plan;
}

/** What one choice does to the model, against the plan that both began with. */
export interface Effect {
  /** g */
  massBy: number;
  /** mm aft; null where one of the two has no balance point */
  balanceBy: number | null;
}

/** The joined plan as chosen; what is not chosen yet stands as mine. */
export function joinedAs({ base, mine, theirs }: Sheets, choices: ReadonlyMap<string, MergeChoice>): Plan {
  return mergePlans(base, mine, theirs, ({ id }) => choices.get(id) ?? 'mine').plan;
}

/** The figures of a joined plan; null where the choices do not go together. */
export function figuresOf(plan: Plan): { mass: number; x: number | null; percentMac: number | null } | null {
  const check = checkPlan(plan);
  if (!check.ok) return null;
  const { totals, balance } = estimate(check.plan);
  return { mass: totals.mass, x: balance.x, percentMac: balance.percentMac };
}

/** What each choice of one conflict does, all else being mine; null for one that leaves no valid plan. */
export function effectsOf(
  sheets: Sheets,
  { id, canKeepBoth }: PlanConflict,
): ReadonlyMap<MergeChoice, Effect | null> {
  const figures = (choice: MergeChoice) => figuresOf(joinedAs(sheets, new Map([[id, choice]])));
  const before = figures('before');
  const choices: MergeChoice[] = ['mine', 'theirs', ...(canKeepBoth ? (['both'] as const) : [])];
  return new Map(
    choices.map((choice) => {
      const after = figures(choice);
      if (before === null || after === null) return [choice, null];
      const balanceBy = before.x === null || after.x === null ? null : after.x - before.x;
      return [choice, { massBy: after.mass - before.mass, balanceBy }];
    }),
  );
}

export type Effects = ReadonlyMap<string, ReadonlyMap<MergeChoice, Effect | null>>;

/** The effects of all choices, worked out one conflict at a time so that the dialog answers meanwhile. */
export function useEffects(sheets: Sheets, conflicts: readonly PlanConflict[]): Effects {
  const [effects, setEffects] = useState<Effects>(new Map());
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout>;
    const next = (i: number) => {
      const conflict = conflicts[i];
      if (!conflict) return;
      setEffects((found) => new Map(found).set(conflict.id, effectsOf(sheets, conflict)));
      timer = setTimeout(next, 0, i + 1);
    };
    timer = setTimeout(next, 0, 0);
    return () => clearTimeout(timer);
  }, [sheets, conflicts]);
  return effects;
}
