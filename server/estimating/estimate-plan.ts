import { estimate } from '#shared/core/estimate.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { QueueFull } from '#server/bounded-queue.ts';
import { invalidInput, unavailable } from '#server/errors.ts';
import { effortOf } from './effort.ts';
import { EstimateWorkers, TookTooLong } from './workers.ts';

/** Up to here an estimate is made on the spot: a glider of 150 parts takes a few milliseconds. */
const SMALL_EFFORT = 50_000;

const workers = new EstimateWorkers();

/**
 * The estimate of a plan: at once for an everyday one, in a thread with a time limit for a large one.
 * @throws AppError `invalid_input` for a plan that takes too long, `unavailable` when too many large ones wait
 */
export async function estimatePlan(plan: Plan): Promise<Estimate> {
  if (effortOf(plan) <= SMALL_EFFORT) return estimate(plan);
  try {
    return await workers.estimate(plan);
  } catch (error) {
    if (error instanceof TookTooLong) {
      const detail = 'Has too many parts that cross each other to be computed in reasonable time.';
      throw invalidInput([{ pointer: '#/plan', detail }]);
    }
    if (error instanceof QueueFull) throw unavailable('Too many large plans at once. Try again in a moment.');
    throw error;
  }
}
