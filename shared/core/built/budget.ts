import type { Plan } from '../plan.ts';
import { accountOf } from './as-built.ts';
import { hear, startBuilt } from './as-built-state.ts';
import { sidedLines } from './sided-lines.ts';
import type { Weighing } from './weighing.ts';

/** The account after one weighing more. Masses g. */
export interface BudgetStep {
  /** the weighing; null for the account before any */
  weighing: string | null;
  weighed: number;
  toCome: number;
  forecast: number;
  /** standard uncertainty of the forecast */
  u: number;
}

/**
 * How the forecast narrows to the truth: the account before anything was weighed and after each weighing.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example budgetOverTime(EXAMPLE_PLAN, [{ id: 'a', covers: [{ line: 'item/nose', side: 'middle' }], mass: 12, u: 0 }]).map(({ weighed }) => weighed) // → [0, 12]
 */
export function budgetOverTime(plan: Plan, weighings: readonly Weighing[]): BudgetStep[] {
  let state = startBuilt(sidedLines(plan), plan.materials);
  const steps = [step(null)];
  for (const weighing of weighings) {
    state = hear(state, weighing);
    steps.push(step(weighing.id));
  }
  return steps;

  function step(weighing: string | null): BudgetStep {
    const { weighed, toCome, mass, u } = accountOf(plan, state);
    return { weighing, weighed, toCome, forecast: mass, u };
  }
}

/**
 * What may still be built in, g: target less what is weighed and what the rest is forecast to weigh; below 0 where
 * the model comes out too heavy.
 * @example budgetLeft(120, { weighed: 60, toCome: 55 }) // → 5
 */
export function budgetLeft(target: number, { weighed, toCome }: { weighed: number; toCome: number }): number {
  return target - weighed - toCome;
}
