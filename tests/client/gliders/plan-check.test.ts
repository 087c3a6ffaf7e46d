import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkPlan } from '#client/features/gliders/plan-check.ts';
import { checkedQuickly } from '#client/features/gliders/plan-quick-check.ts';
import type { Plan } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { edits } from '#tests/support/plan-edits.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

/** What the schema by itself says of a plan, its issues in order, the first of each path. */
function bySchema(plan: unknown) {
  const parsed = planSchema.safeParse(plan);
  if (parsed.success) return { ok: true, plan: parsed.data, issues: new Map() };
  const issues = new Map<string, string>();
  for (const { path, message } of parsed.error.issues) {
    const key = path.map(String).join('/');
    if (!issues.has(key)) issues.set(key, message);
  }
  return { ok: false, issues };
}

/** Values that no field, or not this one, may have. */
const wrong = fc.constantFrom<unknown>(
  '',
  ' name ',
  -1,
  0,
  1e9,
  Number.NaN,
  null,
  undefined,
  [],
  {},
  'gone',
  true,
);

/** Puts a value at some place of a plan, which leaves all objects beside it as they are. */
function put(value: unknown, path: readonly number[], to: unknown): unknown {
  if (path.length === 0 || typeof value !== 'object' || value === null) return to;
  const [first = 0, ...rest] = path;
  if (Array.isArray(value)) {
    const at = value.length === 0 ? 0 : first % value.length;
    return value.map((one: unknown, i) => (i === at ? put(one, rest, to) : one));
  }
  const keys = [...Object.keys(value), 'extra'];
  const key = keys[first % keys.length] ?? 'extra';
  return { ...value, [key]: put((value as Record<string, unknown>)[key], rest, to) };
}

describe('a check that remembers what was good', () => {
  it('says of every edited plan, right or wrong, what the schema says', () => {
    const spoilt = fc.tuple(fc.array(fc.nat({ max: 40 }), { minLength: 1, maxLength: 6 }), wrong);
    const steps = fc.array(fc.tuple(edits, fc.option(spoilt)), { minLength: 1, maxLength: 4 });
    const plans = fc.oneof(anyPlan, fc.constantFrom(...DEMO_NAMES).map(demoPlan));
    const seen = { good: 0, bad: 0 };
    fc.assert(
      fc.property(plans, steps, (first, list) => {
        let plan: Plan = first;
        for (const [edit, spoiling] of list) {
          plan = edit(plan);
          const document = spoiling ? put(plan, ...spoiling) : plan;
          const expected = bySchema(document);
          const found = checkPlan(document);
          expect(found).toEqual(expected);
          expect([...found.issues]).toEqual([...expected.issues]);
          seen[found.ok ? 'good' : 'bad'] += 1;
        }
      }),
      { numRuns: 400 },
    );
    expect(Math.min(seen.good, seen.bad)).toBeGreaterThan(100);
  });

  it('reads an unchanged piece only once', () => {
    const plan = demoPlan('whimbrel');
    const before = checkedQuickly(plan);
    const renamed = { ...plan, name: 'Renamed', surfaces: plan.surfaces.map((surface) => ({ ...surface })) };
    const after = checkedQuickly(renamed);
    expect(after?.name).toBe('Renamed');
    expect(after?.surfaces[0]?.parts[0]).toBe(before?.surfaces[0]?.parts[0]);
  });

  it.each([null, undefined, 3, 'plan', [], {}])('refuses %j as the schema does', (document) => {
    expect(checkedQuickly(document)).toBeNull();
    expect(checkPlan(document)).toEqual(bySchema(document));
  });

  it('counts rows as the schema does', () => {
    const plan = demoPlan('dunlin');
    const [first] = plan.surfaces;
    const many = Array.from({ length: 21 }, (_, i) => ({ ...first!, key: `s${i}` }));
    for (const surfaces of [many, many.slice(0, 20), [{ ...first!, panels: [] }]]) {
      expect(checkPlan({ ...plan, surfaces })).toEqual(bySchema({ ...plan, surfaces }));
    }
  });
});
