import type { Kept } from '#client/features/gliders/desk-state.ts';
import { startPlan } from '#client/features/gliders/start-plan.ts';
import type { Plan } from '#shared/core/plan.ts';

/** A plan told apart by its name. */
export function planNamed(name: string): Plan {
  return startPlan(name);
}

export function keptAt(version: number, plan: Plan, updatedBy = 'Ines'): Kept {
  return { version, plan, updatedAt: '2026-11-30T10:00:00.000Z', updatedBy };
}

/** A recipe that gives the plan a name. */
export const naming = (name: string) => (plan: Plan) => ({ ...plan, name });
