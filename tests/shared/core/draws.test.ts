import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawMasses, drawSteps } from '#shared/core/draws.ts';
import { agreementOf, summaryOf } from '#shared/core/draws-summary.ts';
import { estimate } from '#shared/core/estimate.ts';
import { foldPlan } from '#shared/core/linear-model.ts';
import { weigh } from '#shared/core/linear-model-weigh.ts';
import type { Item, Part, Plan, Solid } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { DEMO_NAMES, demoPlan, planOf, wingOf } from '#tests/support/plans.ts';

const EXACT_THICKNESS = { thickness: 0 };
/** A drawn standard deviation scatters by 1/√(2n); four times that is past chance. */
const PAST_CHANCE = 4;

const stick = (id: string, x: number, material = 'balsa', width = 10): Solid => ({
  id,
  name: id,
  group: 'fuselage',
  material,
  shape: 'bar',
  profile: 'rectangle',
  from: [x, 0, 0],
  to: [x, 100, 0],
  width: [width, width],
  height: [10, 10],
});
const weight: Item = { id: 'lead', name: 'Lead', group: 'ballast', mass: 5, u: 0.2, at: [-50, 0, 0] };
const sheet: Part = { id: 'fin', name: 'Fin', kind: 'sheet', material: 'balsa', thickness: 1, cutout: 0 };
const glue: Part = { id: 'glue', name: 'Glue', kind: 'glue', material: 'glue', method: 'share', share: 0.5 };
const spar: Part = {
  id: 'spar',
  name: 'Spar',
  kind: 'strip',
  material: 'balsa',
  from: 0,
  to: 500,
  seat: 'top',
  at: [0.3, 0.3],
  width: [6, 6],
  height: [3, 3],
  profile: 'rectangle',
  letIn: true,
};

const withoutShares = (plan: Plan): Plan => ({
  ...plan,
  surfaces: plan.surfaces.map((surface) => ({
    ...surface,
    parts: surface.parts.filter((part) => part.kind !== 'glue' || part.method !== 'share'),
  })),
});

describe('draws of the masses', () => {
  it('are the same in one go and in steps, with other draws in between', () => {
    const fold = foldPlan(demoPlan('plover'));
    const options = { seed: 9, draws: 2_345 };
    const steps = drawSteps(fold, options);
    expect(steps.next()).toEqual({ value: 1_000, done: false });
    drawMasses(fold, { seed: 10, draws: 500 });
    expect(steps.next()).toEqual({ value: 2_000, done: false });
    expect(steps.next()).toEqual({ value: drawMasses(fold, options), done: true });
  });

  it('are the same from the same seed, and others from another', () => {
    const fold = foldPlan(demoPlan('dunlin'));
    const [one, again, other] = [4, 4, 5].map((seed) => drawMasses(fold, { seed, draws: 50 }));
    expect(again).toEqual(one);
    expect(other?.mass).not.toEqual(one?.mass);
  });

  it.each(DEMO_NAMES)('of %s scatter as first-order propagation says, to within chance', (name) => {
    const fold = foldPlan(demoPlan(name));
    const { mass, x, firstOrder, nominal } = drawMasses(fold, { seed: 17 });
    for (const [values, u] of [
      [mass, firstOrder.mass],
      [x!, firstOrder.x!],
    ] as const) {
      const agreement = agreementOf(values, u)!;
      expect(Math.abs(agreement.apart!)).toBeLessThan(PAST_CHANCE * agreement.bySampling);
    }
    expect(Math.abs(summaryOf(mass)!.mean - nominal.mass)).toBeLessThan(
      (PAST_CHANCE * firstOrder.mass) / Math.sqrt(mass.length),
    );
  });

  it.each(DEMO_NAMES)(
    'of %s agree with the estimate’s own uncertainty where both reckon the same',
    (name) => {
      // The sheet's figure knows neither thickness nor that glue by share follows its wood.
      const plan = withoutShares(demoPlan(name));
      const { totals, balance } = estimate(plan);
      const drawn = drawMasses(foldPlan(plan), { seed: 23, spreads: EXACT_THICKNESS });
      expectNearly(drawn.firstOrder.mass, totals.u, ROUNDING);
      expectNearly(drawn.firstOrder.x, balance.u!, ROUNDING);
      expectNearly(drawn.firstOrder.percentMac, balance.uPercentMac!, ROUNDING);
      const { apart, bySampling } = agreementOf(drawn.mass, totals.u)!;
      expect(Math.abs(apart!)).toBeLessThan(PAST_CHANCE * bySampling);
    },
  );

  it('of any plan are finite, never below 0, and balance among the parts', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const fold = foldPlan(plan);
        const { mass, x } = drawMasses(fold, { seed: 2, draws: 20 });
        const at = estimate(plan)
          .lines.filter((line) => line.mass > 0)
          .map((line) => line.at[0]);
        const slack = 1e-6 * at.reduce((most, one) => Math.max(most, Math.abs(one)), 1);
        for (const m of mass) expect(m >= 0 && Number.isFinite(m)).toBe(true);
        for (const one of x ?? []) {
          expect(one).toBeGreaterThanOrEqual(Math.min(...at) - slack);
          expect(one).toBeLessThanOrEqual(Math.max(...at) + slack);
        }
      }),
      { numRuns: 200, seed: 29 },
    );
  });

  it('keep to the nominal mass where nothing scatters', () => {
    const fold = foldPlan(planOf([], { items: [{ ...weight, u: 0 }] }));
    const { mass, x, causes } = drawMasses(fold, { seed: 1, draws: 3 });
    expect([...mass, ...(x ?? [])]).toEqual([5, 5, 5, -50, -50, -50]);
    expect(causes).toEqual([]);
  });

  it('refuse less than two draws', () => {
    const fold = foldPlan(planOf([]));
    for (const draws of [1, 0, 2.5]) expect(() => drawMasses(fold, { seed: 1, draws })).toThrow(RangeError);
  });
});

describe('what moves together', () => {
  const two = planOf([], { solids: [stick('fore', 0), stick('aft', 200)] });
  const piece = { id: 'a', name: 'Sheet A', lines: ['solid/fore', 'solid/aft'], cv: 0.1 };

  it('adds up where it is cut from one measured piece, and does not where it is not', () => {
    const apart = drawMasses(foldPlan(two), { seed: 3 });
    const together = drawMasses(foldPlan(two), { seed: 3, pieces: [piece] });
    // Two sticks of 1 g ± 10 %: √2·0.1 g apart, 2·0.1 g together.
    expectNearly(apart.firstOrder.mass, Math.SQRT2 * 0.1, ROUNDING);
    expectNearly(together.firstOrder.mass, 0.2, ROUNDING);
    expect(Math.abs(agreementOf(together.mass, 0.2)!.apart!)).toBeLessThan(0.02);
    expect(together.causes.map(({ id, kind }) => [id, kind])).toEqual([['a', 'piece']]);
  });

  it('does not move the balance point where it moves all alike', () => {
    const { x, firstOrder } = drawMasses(foldPlan(two), { seed: 3, pieces: [piece] });
    expect(firstOrder.x).toBeLessThan(1e-12);
    for (const at of x!.subarray(0, 100)) expectNearly(at, 100, ROUNDING);
  });

  it('is glue by share with its wood', () => {
    const fold = foldPlan(planOf([wingOf([spar, glue])]));
    const wood = weigh(fold).masses[0]!;
    const { firstOrder, mass } = drawMasses(fold, { seed: 5, spreads: { materials: { glue: 0 } } });
    // Half as much glue as wood: what the wood does counts one and a half times.
    expectNearly(firstOrder.mass, 1.5 * 0.1 * wood, ROUNDING);
    const { apart, bySampling } = agreementOf(mass, firstOrder.mass)!;
    expect(Math.abs(apart!)).toBeLessThan(PAST_CHANCE * bySampling);
  });
});

describe('the thickness of sheet', () => {
  const fold = foldPlan(planOf([wingOf([sheet])]));
  const { mass } = weigh(fold);

  it('scatters evenly by a tenth of a millimetre either way unless said otherwise', () => {
    const spreads = { materials: { balsa: 0 } };
    const drawn = drawMasses(fold, { seed: 7, spreads });
    expectNearly(drawn.firstOrder.mass, (0.1 / Math.sqrt(3)) * mass, ROUNDING);
    const [least, most] = [Math.min(...drawn.mass), Math.max(...drawn.mass)];
    expect(least).toBeGreaterThan(0.8999 * mass);
    expect(most).toBeLessThan(1.1001 * mass);
    expect(most - least).toBeGreaterThan(0.199 * mass);
    expectNearly(
      drawMasses(fold, { seed: 7, spreads: { ...spreads, thickness: 0.2 } }).firstOrder.mass,
      2 * drawn.firstOrder.mass,
      ROUNDING,
    );
  });

  it('does not count for a weighed sheet, a stick, or what is known by its areal mass', () => {
    const only = { ...EXACT_THICKNESS };
    const u = (plan: Plan, pieces = [] as Parameters<typeof drawMasses>[1]['pieces']) => {
      const folded = foldPlan(plan);
      return [
        drawMasses(folded, { seed: 1, draws: 2, pieces }).firstOrder.mass,
        drawMasses(folded, { seed: 1, draws: 2, pieces, spreads: only }).firstOrder.mass,
      ];
    };
    const weighed = [{ id: 'a', name: 'A', lines: ['wing/fin'], cv: 0.02 }];
    const [withTolerance, without] = u(planOf([wingOf([sheet])]), weighed);
    expect(withTolerance).toBe(without);
    expectNearly(without, 0.02 * mass, ROUNDING);
    for (const plan of [planOf([wingOf([spar])]), planOf([wingOf([{ ...sheet, material: 'ply' }])])]) {
      const [one, other] = u(plan);
      expect(one).toBe(other);
      expect(one).toBeGreaterThan(0);
    }
  });
});
