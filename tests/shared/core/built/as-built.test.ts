import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asBuilt } from '#shared/core/built/as-built.ts';
import { budgetLeft, budgetOverTime } from '#shared/core/built/budget.ts';
import { sidedLines } from '#shared/core/built/sided-lines.ts';
import type { Weighing } from '#shared/core/built/weighing.ts';
import { estimate } from '#shared/core/estimate.ts';
import { EXAMPLE_PLAN } from '#shared/core/example-wing.ts';
import type { Plan } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

const weighing = (covers: Weighing['covers'], mass: number, u = 0.03, id = 'a'): Weighing => ({
  id,
  covers,
  mass,
  u,
});
const port = (line: string) => ({ line, side: 'port' as const });
const starboard = (line: string) => ({ line, side: 'starboard' as const });
const partOf = (built: ReturnType<typeof asBuilt>, line: string, side: string) =>
  built.parts.find((part) => part.line === line && part.side === side);

/** A demo glider's lines in sets of `size`, each weighed as it is estimated times `factor`. */
function weighAll(plan: Plan, size: number, factor: (i: number) => number): Weighing[] {
  const lines = sidedLines(plan);
  return Array.from({ length: Math.ceil(lines.length / size) }, (_, i) => {
    const set = lines.slice(i * size, (i + 1) * size);
    const mass = set.reduce((sum, line) => sum + line.mass, 0) * factor(i);
    return weighing(set, mass, 0.03, `w${i}`);
  });
}

describe('lines on their sides', () => {
  it.each(DEMO_NAMES)('weigh and balance together as the estimate of %s does', (name) => {
    const plan = demoPlan(name);
    const { totals } = estimate(plan);
    const lines = sidedLines(plan);
    const mass = lines.reduce((sum, line) => sum + line.mass, 0);
    expectNearly(mass, totals.mass, ROUNDING);
    for (const axis of [0, 2] as const) {
      const moment = lines.reduce((sum, line) => sum + line.mass * line.at[axis], 0);
      expectNearly(moment / mass, totals.at?.[axis] ?? Number.NaN, ROUNDING);
    }
  });

  it('leave out of a half what is built on the other', () => {
    const [wing] = EXAMPLE_PLAN.surfaces;
    if (!wing) throw new Error('no wing');
    const parts = wing.parts.map((part) => (part.id === 'spar' ? { ...part, side: 'port' as const } : part));
    const lines = sidedLines({ ...EXAMPLE_PLAN, surfaces: [{ ...wing, parts }] });
    expect(lines.filter(({ line }) => line === 'wing/spar').map(({ side }) => side)).toEqual(['port']);
    expect(lines.find(({ line }) => line === 'wing/spar')?.at[1]).toBeLessThan(0);
  });
});

describe('the account of a model that is being built', () => {
  it.each(DEMO_NAMES)('is the estimate of %s before anything is weighed', (name) => {
    const plan = demoPlan(name);
    const { totals, balance } = estimate(plan);
    const built = asBuilt(plan, []);
    expectNearly(built.mass, totals.mass, ROUNDING);
    expectNearly(built.x, balance.x ?? Number.NaN, ROUNDING);
    expectNearly(built.percentMac, balance.percentMac ?? Number.NaN, ROUNDING);
    expect(built.weighed).toBe(0);
    expect(built.u).toBeGreaterThanOrEqual(totals.u * (1 - ROUNDING));
  });

  it('comes to the sum of the readings once every part is weighed, however they were put together', () => {
    const arbitrary = fc.tuple(
      fc.constantFrom(...DEMO_NAMES),
      fc.integer({ min: 1, max: 9 }),
      fc.array(fc.double({ min: 0.5, max: 2, noNaN: true }), { minLength: 60, maxLength: 60 }),
    );
    fc.assert(
      fc.property(arbitrary, ([name, size, factors]) => {
        const plan = demoPlan(name);
        const weighings = weighAll(plan, size, (i) => factors[i % factors.length] ?? 1);
        const built = asBuilt(plan, weighings);
        const readings = weighings.reduce((sum, one) => sum + one.mass, 0);
        expectNearly(built.mass, readings, ROUNDING);
        expectNearly(built.toCome, 0, ROUNDING);
        expectNearly(built.u, Math.hypot(...weighings.map(({ u }) => u)), ROUNDING);
      }),
      { numRuns: 20 },
    );
  });

  it('moves no figure where a weighing says what was estimated', () => {
    for (const name of DEMO_NAMES) {
      const plan = demoPlan(name);
      const before = asBuilt(plan, []);
      const after = asBuilt(plan, weighAll(plan, 3, () => 1).slice(0, 4));
      expectNearly(after.mass, before.mass, ROUNDING);
      expectNearly(after.x, before.x ?? Number.NaN, ROUNDING);
      after.parts.forEach((part, i) => expectNearly(part.mass, before.parts[i]?.mass ?? 0, ROUNDING));
      expect(after.u).toBeLessThan(before.u);
    }
  });

  it('gives what is weighed its reading and moves the rest of the material towards it, worked by hand', () => {
    // Ribs to port: 1.128 g estimated, 1.5 g weighed. cv 10 %: common and own variance 0.005 each; the scale 0.
    // Gain = 0.005·1.128 / (0.005·1.128² + 0.005·1.128²) = 1/(2·1.128); factor = 1 + (1.5 − 1.128)/(2·1.128).
    const built = asBuilt(EXAMPLE_PLAN, [weighing([port('wing/ribs')], 1.5, 0)]);
    const factor = 1 + (1.5 - 1.128) / (2 * 1.128);
    expect(partOf(built, 'wing/ribs', 'port')?.mass).toBe(1.5);
    expectNearly(partOf(built, 'wing/ribs', 'starboard')?.mass, 1.128 * factor, ROUNDING);
    expectNearly(partOf(built, 'solid/boom', 'middle')?.mass, 1 * factor, ROUNDING);
    expect(partOf(built, 'item/nose', 'middle')?.mass).toBe(10);
    const [balsa] = built.materials;
    expectNearly(balsa?.posterior.mean, factor, ROUNDING);
    expectNearly(balsa?.posterior.sd, Math.sqrt(0.0025 + 0.005), ROUNDING);
    expect(balsa?.evidence).toHaveLength(1);
    expectNearly(balsa?.evidence[0]?.ratio, 1.5 / 1.128, ROUNDING);
  });

  it('keeps what was weighed before when a whole panel is weighed, and gives the rest to the fresh parts', () => {
    const panel = [port('wing/ribs'), port('wing/spar'), port('wing/skin')];
    const built = asBuilt(EXAMPLE_PLAN, [
      weighing([port('wing/ribs')], 1.2, 0.01, 'ribs'),
      weighing(panel, 4.5, 0.01, 'panel'),
    ]);
    expect(partOf(built, 'wing/ribs', 'port')?.mass).toBe(1.2);
    const fresh = ['wing/spar', 'wing/skin'].map((line) => partOf(built, line, 'port')?.mass ?? 0);
    expectNearly((fresh[0] ?? 0) + (fresh[1] ?? 0), 3.3, ROUNDING);
    expectNearly((fresh[1] ?? 0) / (fresh[0] ?? 1), 2.5 / 0.5, ROUNDING);
    expect(built.parts.filter(({ weighing: id }) => id === 'panel')).toHaveLength(3);
    expectNearly(built.weighed, 4.5, ROUNDING);
  });

  it('takes a second reading of the same parts in place of the first, and learns from it once', () => {
    const once = asBuilt(EXAMPLE_PLAN, [weighing([port('wing/ribs')], 1.3)]);
    const twice = asBuilt(EXAMPLE_PLAN, [
      weighing([port('wing/ribs')], 1.3),
      weighing([port('wing/ribs')], 1.3, 0.03, 'again'),
    ]);
    expect(twice.materials).toMatchObject([{ posterior: once.materials[0]?.posterior }]);
    expectNearly(twice.mass, once.mass, ROUNDING);
  });

  it('shifts the set’s place to where it was measured to balance', () => {
    const set = [starboard('wing/ribs'), starboard('wing/spar')];
    const built = asBuilt(EXAMPLE_PLAN, [{ ...weighing(set, 2), x: 60 }]);
    const parts = built.parts.filter(({ weighing: id }) => id === 'a');
    const mass = parts.reduce((sum, part) => sum + part.mass, 0);
    expectNearly(parts.reduce((sum, part) => sum + part.mass * part.at[0], 0) / mass, 60, ROUNDING);
  });

  it('names what a weighing covers and the plan has no more, and counts the rest', () => {
    const built = asBuilt(EXAMPLE_PLAN, [weighing([port('wing/ribs'), port('wing/gone')], 1.2)]);
    expect(built.heard[0]?.strays).toEqual([port('wing/gone')]);
    expect(partOf(built, 'wing/ribs', 'port')?.mass).toBe(1.2);
    const none = asBuilt(EXAMPLE_PLAN, [weighing([port('wing/gone')], 1.2)]);
    expectNearly(none.mass, asBuilt(EXAMPLE_PLAN, []).mass, ROUNDING);
  });

  it('lets what other materials weighed move a material only through what they were weighed with', () => {
    const glue = demoPlan('dunlin');
    const before = asBuilt(glue, []);
    const [first] = before.parts.filter(({ material }) => material !== null);
    if (!first) throw new Error('no part');
    const after = asBuilt(glue, [weighing([first], first.mass * 1.1)]);
    for (const { key, posterior } of after.materials) {
      if (key === first.material) expect(posterior.mean).toBeGreaterThan(1);
      else expect(posterior.mean).toBe(1);
    }
  });

  it('never answers what is no number, whatever the readings', () => {
    const lines = sidedLines(EXAMPLE_PLAN);
    const reading = fc.record({
      id: fc.uuid(),
      covers: fc.subarray(lines).map((set) => set.map(({ line, side }) => ({ line, side }))),
      mass: fc.double({ min: 0, max: 1000, noNaN: true }),
      u: fc.double({ min: 0, max: 10, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(reading, { maxLength: 8 }), (weighings) => {
        const built = asBuilt(EXAMPLE_PLAN, weighings);
        const figures = [built.mass, built.u, built.weighed, built.toCome, built.x ?? 0, built.ux ?? 0];
        const parts = built.parts.flatMap(({ mass, at }) => [mass, ...at]);
        const said = built.materials.flatMap(({ posterior }) => [posterior.mean, posterior.sd]);
        expect([...figures, ...parts, ...said].filter((value) => !Number.isFinite(value))).toEqual([]);
      }),
      { numRuns: 300 },
    );
  });
});

describe('the budget over time', () => {
  it('starts at the estimate and ends at the sum of the readings, its band never wider than before', () => {
    const plan = demoPlan('whimbrel');
    const weighings = weighAll(plan, 4, (i) => (i % 2 ? 1.05 : 0.97));
    const steps = budgetOverTime(plan, weighings);
    expect(steps).toHaveLength(weighings.length + 1);
    expectNearly(steps[0]?.forecast, estimate(plan).totals.mass, ROUNDING);
    expectNearly(
      steps.at(-1)?.forecast,
      weighings.reduce((sum, one) => sum + one.mass, 0),
      ROUNDING,
    );
    expect((steps.at(-1)?.u ?? 1) / (steps[0]?.u ?? 1)).toBeLessThan(0.1);
  });

  it('says what may still be built in', () => {
    expect(budgetLeft(120, { weighed: 80, toCome: 47 })).toBe(-7);
  });
});
