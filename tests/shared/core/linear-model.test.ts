import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { foldPlan, type FoldedPlan } from '#shared/core/linear-model.ts';
import { weigh, withOther } from '#shared/core/linear-model-weigh.ts';
import type { Part, Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { DEMO_NAMES, demoPlan, MATERIALS, planOf, wingOf } from '#tests/support/plans.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

function expectSame(fold: FoldedPlan, result: Estimate): void {
  const weighing = weigh(fold);
  expect(fold.lines.map(({ id }) => id)).toEqual(result.lines.map(({ id }) => id));
  result.lines.forEach((line, i) => expectNearly(weighing.masses[i], line.mass, ROUNDING));
  expectNearly(weighing.mass, result.totals.mass, ROUNDING);
  expectNearly(weighing.wingMass, result.totals.wingMass, ROUNDING);
  if (!result.totals.at) {
    expect(weighing.at).toBeNull();
    return;
  }
  // Plus and minus moments of a balance point near the datum cancel: what rounds is the size of the arms.
  const arms = result.lines.reduce((most, { at }) => Math.max(most, ...at.map(Math.abs)), 1);
  result.totals.at.forEach((x, axis) =>
    expect(Math.abs((weighing.at?.[axis] ?? Number.NaN) - x)).toBeLessThanOrEqual(ROUNDING * arms),
  );
  const { percentMac } = result.balance;
  if (percentMac === null) expect(weighing.percentMac).toBeNull();
  else
    expect(Math.abs((weighing.percentMac ?? Number.NaN) - percentMac)).toBeLessThanOrEqual(
      (100 * ROUNDING * arms) / (fold.wing?.mac ?? 1),
    );
}

const rib = (id: string, material: string, fields: Partial<Part> = {}): Part =>
  ({
    id,
    name: id,
    kind: 'ribs',
    material,
    stations: [0, 100],
    thickness: 2,
    lightening: 0,
    ...fields,
  }) as Part;
const glue: Part = { id: 'glue', name: 'Glue', kind: 'glue', material: 'glue', method: 'share', share: 0.5 };

describe('a folded plan', { timeout: 120_000 }, () => {
  it('times its densities is the estimate, for any plan that the schema accepts', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => expectSame(foldPlan(plan), estimate(plan))),
      { numRuns: 400, seed: 41 },
    );
  });

  it('still is when every figure of its materials is another', () => {
    const grown = (plan: Plan): Plan => {
      const times = (value: number | undefined, by: number) => (value === undefined ? undefined : value * by);
      const materials = Object.entries(plan.materials).map(([key, m], i) => [
        key,
        {
          ...m,
          density: times(m.density, 1.5 + i),
          areal: times(m.areal, 0.3 + i),
          spread: times(m.spread, 7),
        },
      ]);
      return { ...plan, materials: Object.fromEntries(materials) };
    };
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const { lines } = foldPlan(plan);
        const other = foldPlan(grown(plan));
        lines.forEach((line, i) => {
          expectNearly(other.lines[i]?.amount, line.amount, ROUNDING);
        });
        const figures = other.lines.map(({ figure }) => figure);
        const masses = estimate(grown(plan)).lines.map(({ mass }) => mass);
        weigh(foldPlan(plan), figures).masses.forEach((m, i) =>
          expectNearly(m, masses[i] ?? Number.NaN, ROUNDING),
        );
      }),
      { numRuns: 100, seed: 43 },
    );
  });

  it.each(DEMO_NAMES)('of the demo glider %s weighs and balances as its estimate', (name) => {
    const plan = demoPlan(name);
    expectSame(foldPlan(plan), estimate(plan));
  });

  it('lets glue by share follow the wood that it holds, and no other', () => {
    const fold = foldPlan(
      planOf([wingOf([rib('light', 'balsa'), rib('hard', 'hard'), rib('ply', 'ply'), glue])]),
    );
    const [light = 0, hard = 0, ply = 0, share = 0] = weigh(fold).masses;
    expectNearly(share, 0.5 * (light + hard + ply), ROUNDING);
    const doubled = weigh(fold, [
      2 * (fold.lines[0]?.figure ?? 0),
      ...fold.lines.slice(1).map((l) => l.figure),
    ]);
    expectNearly(doubled.masses[3], share + 0.5 * light, ROUNDING);
  });
});

describe('another wood', () => {
  const plan = demoPlan('whimbrel');
  const hard = { key: 'hard', material: { name: 'Hard', category: 'wood', density: 240, cv: 0.03 } } as const;

  it('on folded lines weighs as the plan drawn in it', () => {
    const spars = withWood(plan, { ribs: hard });
    const lines = Object.fromEntries(
      foldPlan(plan)
        .lines.filter(({ group, material }) => group === 'ribs' && material !== null)
        .map(({ id }) => [id, hard]),
    );
    const other = withOther(foldPlan(plan), lines);
    expect(Object.keys(lines).length).toBeGreaterThan(1);
    expectSame(other ?? foldPlan(plan), estimate(spars));
    expect(weigh(other ?? foldPlan(plan)).mass).not.toBe(weigh(foldPlan(plan)).mass);
  });

  it('is refused where the amount says nothing of it', () => {
    const fold = foldPlan(planOf([wingOf([rib('light', 'balsa'), rib('ply', 'ply'), glue])]));
    const balsa = MATERIALS['balsa']!;
    expect(withOther(fold, { 'wing/light': { key: 'ply', material: MATERIALS['ply']! } })).toBeNull();
    expect(withOther(fold, { 'wing/ply': { key: 'balsa', material: balsa } })).toBeNull();
    const carbon = { ...balsa, category: 'composite' } as const;
    expect(withOther(fold, { 'wing/light': { key: 'carbon', material: carbon } })).toBeNull();
    expect(withOther(fold, { 'wing/light': { key: 'balsa', material: balsa } })).not.toBeNull();
  });
});
