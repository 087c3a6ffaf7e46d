import { describe, expect, it } from 'vitest';
import { USUAL_SETTINGS } from '#client/features/trial/draws/settings.ts';
import {
  workOut,
  type AnswerOf,
  type DrawLimits,
  type DrawTask,
} from '#client/features/trial/draws/tasks.ts';
import { trimmedPlan } from '#client/features/trial/draws/trimmed-plan.ts';
import { drawMasses } from '#shared/core/draws.ts';
import { chanceWithin, summaryOf } from '#shared/core/draws-summary.ts';
import { estimate } from '#shared/core/estimate.ts';
import { foldPlan } from '#shared/core/linear-model.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { demoPlan, planOf } from '#tests/support/plans.ts';

function answerOf<Task extends DrawTask>(task: Task): { answer: AnswerOf<Task>; progress: number[] } {
  const steps = workOut(task);
  const progress: number[] = [];
  for (;;) {
    const step = steps.next();
    if (step.done === true) return { answer: step.value, progress };
    progress.push(step.value);
  }
}

const dunlin = demoPlan('dunlin');
const settings = { ...USUAL_SETTINGS, draws: 4_000 };

describe('the figures of one plan', () => {
  it('are those of the core’s own draws', () => {
    const { answer } = answerOf({ of: 'figures', plan: dunlin, settings });
    const draws = drawMasses(foldPlan(dunlin), { seed: 1, draws: 4_000, spreads: { thickness: 0.1 } });
    expect(answer.mass).toEqual(summaryOf(draws.mass));
    expect(answer.percentMac).toEqual(summaryOf(draws.percentMac!));
    const { percentMac, tolerance } = dunlin.target!;
    const wanted = { min: percentMac - tolerance, max: percentMac + tolerance };
    expect(answer.onTarget).toEqual(chanceWithin([{ values: draws.percentMac!, ...wanted }]));
  });

  it('are the same from the same seed and others from another', () => {
    const of = (seed: number) =>
      answerOf({ of: 'figures', plan: dunlin, settings: { ...settings, seed } }).answer;
    expect(of(5)).toEqual(of(5));
    expect(of(5).mass).not.toEqual(of(6).mass);
  });

  it('scatter less where a piece was weighed, and more with thicker doubt', () => {
    const u = (more: Partial<typeof settings>) =>
      answerOf({ of: 'figures', plan: dunlin, settings: { ...settings, ...more } }).answer.mass!.u;
    const lines = estimate(dunlin).lines.map(({ id }) => id);
    const pieces = [{ id: 'one', name: 'Sheet', lines, cv: 0 }];
    expect(u({ pieces })).toBeLessThan(u({}));
    expect(u({ thickness: 0.5 })).toBeGreaterThan(u({}));
  });

  it('have no balance and no chance without a mass', () => {
    const { answer } = answerOf({ of: 'figures', plan: planOf([]), settings });
    expect(answer.x).toBeNull();
    expect(answer.onTarget).toBeNull();
    expect(answer.nominal.mass).toBe(0);
  });

  it('tell how far they have come, never backward', () => {
    const { progress } = answerOf({ of: 'figures', plan: dunlin, settings });
    expect(progress).toEqual([0.25, 0.5, 0.75]);
  });
});

describe('chances of keeping limits', () => {
  const chances = (limits: DrawLimits, plans = [dunlin]) =>
    answerOf({ of: 'chances', plans, limits, settings }).answer;
  const nominal = estimate(dunlin);

  it('are of each limit by itself and of all together', () => {
    const mass = { max: nominal.totals.mass };
    const percentMac = { min: nominal.balance.percentMac! };
    const [one] = chances({ mass, percentMac });
    expect(one!.mass!.share).toBeGreaterThan(0.4);
    expect(one!.balance!.share).toBeLessThan(0.6);
    expect(one!.all!.share).toBeLessThanOrEqual(Math.min(one!.mass!.share, one!.balance!.share));
    expect(chances({ mass })[0]).toEqual({ mass: one!.mass, balance: null, all: one!.mass });
  });

  it('are none without a limit, a plan, a mass or a wing to balance by', () => {
    const mass = { min: 1 };
    expect(chances({})[0]).toEqual({ mass: null, balance: null, all: null });
    expect(
      answerOf({ of: 'chances', plans: [null, dunlin], limits: { mass }, settings }).answer[0],
    ).toBeNull();
    expect(chances({ mass }, [planOf([])])[0]!.all).toBeNull();
    const item = {
      id: 'lead',
      name: 'Lead',
      group: 'ballast',
      mass: 5,
      at: [0, 0, 0] as [number, number, number],
    };
    const [wingless] = chances({ mass, percentMac: { min: 10 } }, [planOf([], { items: [item] })]);
    expect(wingless!.mass!.share).toBe(1);
    expect(wingless!.all).toBeNull();
  });
});

describe('a plan trimmed as a trial', () => {
  it('weighs what the trial weighs, with its ballast in place of the plan’s own', () => {
    const trimmed = trimmedPlan(dunlin, { materials: {} }, [
      { mass: 7, x: -100 },
      { mass: 2, x: 50 },
    ]);
    const bare = trimmedPlan(dunlin, { materials: {} }, []);
    expectNearly(estimate(trimmed).totals.mass - estimate(bare).totals.mass, 9, ROUNDING);
    expect(new Set(trimmed.items.map(({ id }) => id)).size).toBe(trimmed.items.length);
  });
});
