import { describe, expect, it } from 'vitest';
import { drawMasses } from '#shared/core/draws.ts';
import { chanceWithin, sharesByMaterial } from '#shared/core/draws-summary.ts';
import { foldPlan } from '#shared/core/linear-model.ts';
import type { Item, Solid } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { DEMO_NAMES, demoPlan, planOf } from '#tests/support/plans.ts';

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

describe('contributions to the variance', () => {
  it('add up to the whole, to first order exactly and drawn about', () => {
    for (const name of DEMO_NAMES) {
      const draws = drawMasses(foldPlan(demoPlan(name)), { seed: 31 });
      for (const what of ['mass', 'balance'] as const) {
        const sum = (how: 'firstOrder' | 'drawn') =>
          draws.causes.reduce((total, cause) => total + cause[what][how], 0);
        expectNearly(sum('firstOrder'), 1, ROUNDING);
        expect(Math.abs(sum('drawn') - 1)).toBeLessThan(0.05);
      }
    }
  });

  it('are drawn as first order says, cause by cause', () => {
    const { causes, mass } = drawMasses(foldPlan(demoPlan('whimbrel')), { seed: 37 });
    for (const { name, mass: m, balance: b } of causes) {
      // A share r² scatters by 2r√(1 − r²)/√n or so.
      for (const { firstOrder, drawn } of [m, b]) {
        const chance = (2 * Math.sqrt(firstOrder) + 5 / Math.sqrt(mass.length)) / Math.sqrt(mass.length);
        expect(Math.abs(drawn - firstOrder), name).toBeLessThan(5 * chance);
      }
    }
  });

  it('belong to the wood, the glue and the items that make them', () => {
    const plan = planOf([], { items: [weight], solids: [stick('a', 0), stick('b', 0, 'hard', 20)] });
    // u² in g²: 0.1² of balsa, (0.05 · 4)² of hard balsa, 0.2² of the weight.
    const shares = sharesByMaterial(drawMasses(foldPlan(plan), { seed: 41 }));
    const wanted = new Map<string | null, number>([
      ['hard', 4 / 9],
      [null, 4 / 9],
      ['balsa', 1 / 9],
    ]);
    expect(shares).toHaveLength(3);
    for (const { material, mass } of shares) {
      expectNearly(mass.firstOrder, wanted.get(material) ?? Number.NaN, ROUNDING);
      expect(Math.abs(mass.drawn - mass.firstOrder)).toBeLessThan(0.03);
    }
  });
});

describe('the chance of keeping limits', () => {
  it('is that of the normal distribution for one uncertain mass', () => {
    const { mass } = drawMasses(foldPlan(planOf([], { items: [weight] })), { seed: 43 });
    // 15.87 % lie more than one standard deviation above the mean, 0.2 g above 5 g.
    const { share, standardError } = chanceWithin([{ values: mass, min: 5.2 }])!;
    expect(Math.abs(share - 0.158655)).toBeLessThan(PAST_CHANCE * standardError);
    expect(standardError).toBeLessThan(0.003);
  });

  it('of two limits at once is no more than of either', () => {
    const { mass, percentMac, nominal } = drawMasses(foldPlan(demoPlan('plover')), { seed: 47 });
    const byMass = { values: mass, min: nominal.mass };
    const byBalance = { values: percentMac!, min: nominal.percentMac! - 0.5, max: nominal.percentMac! + 0.5 };
    const [one, other, both] = [[byMass], [byBalance], [byMass, byBalance]].map(
      (l) => chanceWithin(l)!.share,
    );
    expect(both).toBeLessThanOrEqual(Math.min(one!, other!));
    expect(both).toBeGreaterThanOrEqual(one! + other! - 1);
    expect(one).toBeGreaterThan(0.4);
  });

  it('is never told as certain by a limited number of draws', () => {
    expect(chanceWithin([{ values: [1, 2, 3, 4] }])).toEqual({ share: 1, standardError: expect.any(Number) });
    expect(chanceWithin([{ values: [1, 2, 3, 4], min: 9 }])!.standardError).toBeGreaterThan(0);
    expect(chanceWithin([])).toBeNull();
  });
});
