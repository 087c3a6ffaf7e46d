import { describe, expect, it } from 'vitest';
import dunlin from '#data/demo/gliders/dunlin.json';
import plover from '#data/demo/gliders/plover.json';
import whimbrel from '#data/demo/gliders/whimbrel.json';
import { estimate } from '#shared/core/estimate.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { differences } from './compare.ts';
import { builtPlans } from './plans-built.ts';
import { joinedPlans } from './plans-joined.ts';
import { materialPlans } from './plans-materials.ts';
import { mixedPlans } from './plans-mixed.ts';
import { shapedPlans } from './plans-shaped.ts';
import { secondOpinion } from './second-opinion.ts';

/** Thousands of slices take a second or two for each glider, more on a busy machine. */
const SLOW = 60_000;

const demo = [dunlin, plover, whimbrel].map((plan) => planSchema.parse(plan));

/**
 * A second calculator, of thin slices and plain sums, written from the rules alone: it shares no formula with the
 * estimate but those of the plan. Where the two agree on every figure, an error would have to be in both.
 */
describe('second opinion', () => {
  it.each(
    [...demo, ...builtPlans, ...joinedPlans, ...shapedPlans, ...materialPlans, ...mixedPlans].map(
      (plan) => [plan.name, plan] as const,
    ),
  )(
    'agrees with the estimate on every figure: %s',
    (_name, plan) => {
      expect(planSchema.safeParse(plan).error).toBeUndefined();
      expect(differences(estimate(plan), secondOpinion(plan))).toEqual([]);
    },
    SLOW,
  );

  it(
    'would tell a line that weighs 0.2 % more, lies 0.2 mm higher or is missing',
    () => {
      const plan = demo[1];
      if (!plan) throw new Error('There is no plan.');
      const first = estimate(plan);
      const second = secondOpinion(plan);
      const [line] = first.lines;
      if (!line) throw new Error('The plan has no line.');
      const others = first.lines.slice(1);
      const changed = (change: object) =>
        differences({ ...first, lines: [{ ...line, ...change }, ...others] }, second);
      expect(changed({ mass: line.mass * 1.002 })).toHaveLength(1);
      expect(changed({ at: [line.at[0], line.at[1], line.at[2] + 0.2] })).toHaveLength(1);
      expect(differences({ ...first, lines: others }, second)).toEqual([`${line.id}: missing`]);
    },
    SLOW,
  );
});
