import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isAlike } from '#shared/core/alike.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import { mergePlans } from '#shared/core/plan-merge.ts';
import type { Plan } from '#shared/core/plan.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { edits, type PlanEdit } from '#tests/support/plan-edits.ts';
import { demoPlan } from '#tests/support/plans.ts';

const base = demoPlan('dunlin');
const twoSides = (claim: (mine: Plan, theirs: Plan) => void) =>
  fc.assert(
    fc.property(edits, edits, (one: PlanEdit, other: PlanEdit) => claim(one(base), other(base))),
    { numRuns: 300 },
  );
/** Order apart: where all but one thing of a list are gone, there is none left to have been changed. */
const changeWords = (plan: Plan) =>
  planChanges(base, plan)
    .filter(({ field }) => field !== 'order')
    .map(({ path, field, to }) => JSON.stringify([path, field, to]));

describe('joining two plans', () => {
  it('gives the other side where one side changed nothing, whatever the plans are', () => {
    fc.assert(
      fc.property(anyPlan, anyPlan, (one, other) => {
        for (const merged of [mergePlans(one, one, other), mergePlans(one, other, one)]) {
          expect(isAlike(merged.plan, other)).toBe(true);
          expect(merged.conflicts).toEqual([]);
        }
      }),
    );
    twoSides((mine) => {
      expect(planChanges(mergePlans(base, mine, structuredClone(base)).plan, mine)).toEqual([]);
    });
  });

  it('takes once what both changed alike', () => {
    twoSides((mine) => {
      const merged = mergePlans(base, mine, structuredClone(mine));
      expect(merged.conflicts).toEqual([]);
      expect(isAlike(merged.plan, mine)).toBe(true);
    });
  });

  it('does not depend on who merges where there is no conflict', () => {
    let joined = 0;
    twoSides((mine, theirs) => {
      const [here, there] = [mergePlans(base, mine, theirs), mergePlans(base, theirs, mine)];
      expect(here.conflicts.length).toBe(there.conflicts.length);
      if (here.conflicts.length > 0) return;
      joined += 1;
      expect(isAlike(here.plan, there.plan)).toBe(true);
    });
    expect(joined).toBeGreaterThan(30);
  });

  it('gives mine here what is theirs there, choice by choice', () => {
    let settled = 0;
    twoSides((mine, theirs) => {
      const here = mergePlans(base, mine, theirs, () => 'theirs');
      const there = mergePlans(base, theirs, mine, () => 'mine');
      settled += here.conflicts.length;
      expect(isAlike(here.plan, there.plan)).toBe(true);
    });
    expect(settled).toBeGreaterThan(10);
  });

  it('holds every change of either side where there is no conflict, and none besides', () => {
    let joined = 0;
    twoSides((mine, theirs) => {
      const { plan, conflicts } = mergePlans(base, mine, theirs);
      if (conflicts.length > 0) return;
      joined += 1;
      expect(new Set(changeWords(plan))).toEqual(new Set([...changeWords(mine), ...changeWords(theirs)]));
    });
    expect(joined).toBeGreaterThan(30);
  });

  it('leaves the plans that it is given as they are', () => {
    twoSides((mine, theirs) => {
      const before = structuredClone([base, mine, theirs]);
      mergePlans(base, mine, theirs, () => 'both');
      expect([base, mine, theirs]).toEqual(before);
    });
  });
});
