import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { joinChanges } from '#client/features/log/saves/join-changes.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { PlanChangeDto } from '#shared/schemas/glider-save.ts';
import { edits } from '#tests/support/plan-edits.ts';
import { demoPlan } from '#tests/support/plans.ts';
import { changesBetween } from './saves.ts';

const plan = demoPlan('dunlin');
/** Order apart: a list that was turned twice may stand as it did. */
const told = (changes: readonly PlanChangeDto[]) =>
  changes
    .filter(({ field }) => field !== 'order')
    .map(({ path, field, from, to }) => JSON.stringify([path, field, from, to]))
    .sort();

describe('what several saves come to', () => {
  it('is what a comparison of the first state with the last would tell', () => {
    fc.assert(
      fc.property(edits, edits, edits, (first, second, third) => {
        const states = [plan];
        for (const edit of [first, second, third]) states.push(edit(states.at(-1)!));
        const steps = states.slice(1).map((state, i) => changesBetween(states[i]!, state));
        expect(told(joinChanges(steps).list)).toEqual(told(planChanges(plan, states.at(-1)!)));
      }),
    );
  });

  it('is nothing where all was changed back', () => {
    const wider = structuredClone(plan);
    wider.surfaces[0]!.panels[0]!.rootChord += 7;
    const there = changesBetween(plan, wider);
    const back = changesBetween(wider, plan);
    expect(joinChanges([there, back]).list).toEqual([]);
  });

  it('adds masses up, and is not known where one of them is not', () => {
    const one = changesBetween(plan, plan);
    expect(joinChanges([one, one, one])).toMatchObject({ massBy: 3, balanceBy: -1.5 });
    expect(joinChanges([one, { ...one, balanceBy: null }])).toMatchObject({ massBy: 2, balanceBy: null });
  });

  it('says how many more changes there are than were kept', () => {
    const one = { ...changesBetween(plan, plan), more: 12 };
    expect(joinChanges([one, one]).more).toBe(24);
  });
});
