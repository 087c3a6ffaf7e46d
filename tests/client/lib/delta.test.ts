import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applied, deltaOf } from '#client/lib/delta.ts';
import { same } from '#client/lib/same.ts';
import { edits } from '#tests/support/plan-edits.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('whimbrel');
const carried = (value: unknown): unknown => JSON.parse(JSON.stringify(value));
const json = fc.jsonValue().map(carried);

describe('a delta', () => {
  it('leads from any value to any other, also as JSON', () => {
    fc.assert(
      fc.property(json, json, (from, to) => {
        const delta = carried(deltaOf(from, to)) as ReturnType<typeof deltaOf>;
        expect(same(applied(from, delta), to)).toBe(true);
      }),
    );
  });

  it('leads through the edits of a plan', () => {
    fc.assert(
      fc.property(edits, (edit) => {
        const after = edit(plan);
        const delta = deltaOf(plan, after);
        expect(same(applied(plan, carried(delta) as typeof delta), after)).toBe(true);
      }),
    );
  });

  it('is small where little differs, in a long list too', () => {
    const [wing, ...others] = plan.surfaces;
    const shorter = { ...plan, surfaces: [{ ...wing, parts: wing?.parts.slice(1) }, ...others] };
    const renamed = { ...plan, items: plan.items.map((item, i) => (i === 2 ? { ...item, mass: 7 } : item)) };
    for (const after of [shorter, renamed])
      expect(JSON.stringify(deltaOf(plan, structuredClone(after))).length).toBeLessThan(80);
  });

  it('is none between values that say the same', () => {
    expect(deltaOf(plan, structuredClone(plan))).toBeNull();
    expect(deltaOf({ a: undefined, b: 1 }, { b: 1 })).toBeNull();
  });

  it('leaves the value that it starts from as it is', () => {
    const from = { a: [1, 2, 3], b: { c: 1 } };
    const delta = deltaOf(from, { a: [1, 3], b: { d: 2 } });
    applied(from, delta);
    expect(from).toEqual({ a: [1, 2, 3], b: { c: 1 } });
  });
});
