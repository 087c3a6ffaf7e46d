import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareStates } from '#client/features/log/compare/compare-states.ts';
import { estimate } from '#shared/core/estimate.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import { edits } from '#tests/support/plan-edits.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('dunlin');
const compare = (before: Plan, after: Plan) =>
  compareStates({ plan: before, result: estimate(before) }, { plan: after, result: estimate(after) });
const changed = (change: (copy: Plan) => void) => {
  const copy = structuredClone(plan);
  change(copy);
  return copy;
};

describe('two states beside each other', () => {
  it('are alike where nothing was changed', () => {
    const { lines, others, massBy, balanceBy } = compare(plan, structuredClone(plan));
    expect([lines.some(({ differs }) => differs), others, massBy, balanceBy]).toEqual([false, [], 0, 0]);
  });

  it('tell each change once: at its part, or among what belongs to no part', () => {
    fc.assert(
      fc.property(edits, (edit) => {
        const after = edit(plan);
        const { lines, others } = compare(plan, after);
        const told = [...lines.flatMap(({ changes }) => changes), ...others];
        expect(told).toHaveLength(planChanges(plan, after).length);
      }),
      { numRuns: 40 },
    );
  });

  it('add up: what the parts differ by is what the model differs by', () => {
    fc.assert(
      fc.property(edits, (edit) => {
        const { lines, massBy } = compare(plan, edit(plan));
        const sum = lines.reduce((s, { before, after }) => s + (after?.mass ?? 0) - (before?.mass ?? 0), 0);
        expect(Math.abs(sum - massBy)).toBeLessThan(1e-9);
      }),
      { numRuns: 40 },
    );
  });

  it('mark what only follows from another change: thicker sheeting leaves the ribs less', () => {
    const { lines } = compare(
      plan,
      changed((copy) => {
        const sheeting = copy.surfaces[0]?.parts.find(({ id }) => id === 'nose-sheeting');
        Object.assign(sheeting ?? {}, { thickness: 2 });
      }),
    );
    const line = (id: string) => lines.find((one) => one.id === id);
    expect(line('wing/nose-sheeting')?.changes).toMatchObject([{ field: 'thickness', to: 2 }]);
    expect(line('wing/ribs-inner')).toMatchObject({ changes: [], differs: true });
    expect(line('tailplane/ribs')).toMatchObject({ changes: [], differs: false });
  });

  it('keep what was removed in its place and what was added in its own', () => {
    const after = changed((copy) => {
      const [first, ...rest] = copy.items;
      copy.items = [{ ...first!, id: 'hook', name: 'Tow hook' }, ...rest];
    });
    const ids = compare(plan, after).lines.map(({ id }) => id);
    const removed = `item/${plan.items[0]!.id}`;
    expect(ids.indexOf(removed)).toBe(ids.indexOf('item/hook') - 1);
    expect(compare(plan, after).lines.find(({ id }) => id === removed)?.after).toBeNull();
  });
});
