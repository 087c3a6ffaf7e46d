import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import type { Part, Plan } from '#shared/core/plan.ts';
import { QueueFull } from '#server/bounded-queue.ts';
import { effortOf } from '#server/estimating/effort.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { EstimateWorkers, TookTooLong } from '#server/estimating/workers.ts';
import { demoPlan, DEMO_NAMES, planOf, wingOf } from '#tests/support/plans.ts';

/** Half skins, half strips under them: each has to be looked at against each. */
function crossed(count: number): Plan {
  const parts = Array.from({ length: count }, (_, i): Part => {
    const base = { id: `p${i}`, name: 'P', material: 'balsa', from: 0, to: 500 };
    return i % 2
      ? { ...base, kind: 'skin', start: 0.1, end: 0.6, seat: 'top', thickness: 1 }
      : {
          ...base,
          kind: 'strip',
          at: [0.3, 0.3],
          seat: 'top',
          width: [3, 3],
          height: [1, 1],
          profile: 'rectangle',
          letIn: true,
        };
  });
  return planOf([wingOf(parts)]);
}

describe('estimating on the server', () => {
  it.each(DEMO_NAMES)('takes %s for an everyday plan', (name) => {
    expect(effortOf(demoPlan(name))).toBeLessThan(25_000);
  });

  it('gives a large plan, made in a thread, the very figures of the core', async () => {
    const plan = crossed(260);
    expect(effortOf(plan)).toBeGreaterThan(50_000);
    expect(await estimatePlan(plan)).toEqual(estimate(plan));
    expect(await estimatePlan(crossed(240))).toEqual(estimate(crossed(240)));
  });

  it('leaves the service free while a thread works', async () => {
    const workers = new EstimateWorkers({ atOnce: 1 });
    let ticks = 0;
    const timer = setInterval(() => (ticks += 1), 5);
    await workers.estimate(crossed(1_000));
    clearInterval(timer);
    expect(ticks).toBeGreaterThan(5);
  });

  it('gives up a plan that takes too long, and its place to the next', async () => {
    const workers = new EstimateWorkers({ atOnce: 1, mostWaiting: 0, patienceMs: 1 });
    await expect(workers.estimate(crossed(2_000))).rejects.toThrow(TookTooLong);
    await expect(workers.estimate(crossed(2_000))).rejects.toThrow(TookTooLong);
  });

  it('uses one thread for one plan after the other', async () => {
    const workers = new EstimateWorkers({ atOnce: 1 });
    for (const count of [4, 6, 8])
      expect(await workers.estimate(crossed(count))).toEqual(estimate(crossed(count)));
  });

  it('tells a failure in the thread, and does the next one all the same', async () => {
    const workers = new EstimateWorkers({ atOnce: 1 });
    const plan = { ...crossed(2), materials: {} };
    await expect(workers.estimate(plan)).rejects.toThrow(RangeError);
    expect(await workers.estimate(crossed(2))).toEqual(estimate(crossed(2)));
  });

  it('refuses more large plans than may wait', async () => {
    const workers = new EstimateWorkers({ atOnce: 1, mostWaiting: 0 });
    const first = workers.estimate(crossed(300));
    await expect(workers.estimate(crossed(2))).rejects.toThrow(QueueFull);
    await first;
  });
});
