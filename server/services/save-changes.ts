import type { Plan } from '#shared/core/plan.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { SaveChanges } from '#shared/schemas/glider-save.ts';
import { LIMITS } from '#shared/schemas/limits.ts';

interface State {
  plan: Plan;
  /** g */
  mass: number;
  /** mm aft of the datum; null where there is none, or it was not kept */
  balance: number | null;
}

/** What a save changes, as its row of the log keeps it. */
export function saveChanges(before: State, after: State): SaveChanges {
  const changes = planChanges(before.plan, after.plan);
  const list = changes.slice(0, LIMITS.changes.max);
  return {
    list,
    more: changes.length - list.length,
    massBy: after.mass - before.mass,
    balanceBy: before.balance === null || after.balance === null ? null : after.balance - before.balance,
  };
}
