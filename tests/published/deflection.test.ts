import { describe, expect, it, test } from 'vitest';
import reference from '#data/reference/deflection.json';
import { bendOf, endRise } from '#shared/core/deflection.ts';
import { loadFactorAt, speedAtLoadFactor } from '#shared/core/load-cases.ts';
import type { Strip } from '#shared/core/plan.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';
import { expectNear, expectPrinted, NINE_DIGITS } from './tolerance.ts';

test.each(reference.cantilevers.rows)(
  `cantilever, $load (${reference.cantilevers.source})`,
  ({ moment, rise }) => {
    // Length 1, load 1, stiffness 1; the middle rule over n slices is off by less than 1/n².
    const slices = 2000;
    const places = Array.from({ length: slices }, (_, i) => {
      const at = (i + 0.5) / slices;
      const curvature = moment.reduce((sum, factor, power) => sum + factor * at ** power, 0);
      return { curvature, lever: 1 - at, ds: 1 / slices };
    });
    expectNear(endRise(places), rise, 1 / slices ** 2);
  },
);

describe('the bend of a drawn spar', () => {
  const spar: Strip = {
    id: 'spar',
    name: 'Spar',
    kind: 'strip',
    material: 'spruce',
    from: 0,
    to: 500,
    at: [0.3, 0.3],
    seat: 'top',
    width: [6, 6],
    height: [4, 4],
    profile: 'rectangle',
    letIn: true,
  };
  const materials = {
    spruce: { name: 'Spruce', category: 'wood' as const, density: 450, cv: 0.1, modulus: 10, strength: 70 },
  };
  const wing = wingOf([spar]);
  const plan = planOf([wing], { materials });
  // 6 × 4 mm upright, 10 GPa: EI = 10 000·6·4³/12.
  const stiffness = 320_000;

  it(`rises by Schrenk's share on a uniform spar (${reference.schrenkPlank.source})`, () => {
    const force = (0.25 * 9.80665) / 2;
    const bend = bendOf(plan, wing, 250);
    expectNear(bend?.rootStiffness, stiffness, NINE_DIGITS);
    // Ten printed digits of the rise; the ellipse's end is square to the beam, where five points a piece are coarser.
    expectNear(bend?.tip, (reference.schrenkPlank.rise * force * 500 ** 3) / stiffness, 1e-6);
  });

  it('does not hang on where the spar is cut in two', () => {
    const halves = [
      { ...spar, id: 'inner', to: 180 },
      { ...spar, id: 'outer', from: 180 },
    ];
    expectNear(bendOf(plan, wingOf(halves), 250)?.tip, bendOf(plan, wing, 250)?.tip ?? Number.NaN, 1e-5);
  });

  it('is straight beyond the end of the spar', () => {
    const short = bendOf(plan, wingOf([{ ...spar, to: 300 }]), 250);
    expect(short?.reach).toBe(300);
    expect(short?.tip).toBeLessThan(bendOf(plan, wing, 250)?.tip ?? 0);
  });

  it('is not told of a spar with a gap, nor of a wing that carries nothing', () => {
    const gap = [
      { ...spar, id: 'inner', to: 180 },
      { ...spar, id: 'outer', from: 220 },
    ];
    expect(bendOf(plan, wingOf(gap), 250)).toBeNull();
    expect(bendOf(plan, wing, 0)).toBeNull();
    expect(bendOf(plan, wingOf([]), 250)).toBeNull();
  });
});

test.each(reference.manoeuvre.rows)(
  `n = $loadFactor is reached at $speedOverStall × the stall speed (${reference.manoeuvre.source})`,
  ({ loadFactor, speedOverStall }) => {
    expectPrinted(speedAtLoadFactor(loadFactor, 1), speedOverStall, 6);
    expectNear(loadFactorAt(speedOverStall, 1), loadFactor, 1e-6);
  },
);
