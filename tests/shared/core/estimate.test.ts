import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import type { Item, Part, Plan, Surface } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { lineOf, planOf, wingOf } from '#tests/support/plans.ts';

const item = (id: string, mass: number, x: number, u?: number): Item => ({
  id,
  name: id,
  group: 'gear',
  mass,
  at: [x, 0, 0],
  ...(u === undefined ? {} : { u }),
});
const tailplane: Surface = {
  ...wingOf([]),
  key: 'tailplane',
  role: 'tailplane',
  apex: [600, 0, 0],
  panels: [
    {
      span: 200,
      rootChord: 100,
      tipChord: 100,
      sweep: 0,
      dihedral: 0,
      rootSection: { flat: 3 },
      tipSection: { flat: 3 },
    },
  ],
};
const codes = (plan: Plan) => estimate(plan).notices.map((notice) => notice.code);

describe('balance', () => {
  it('is the masses’ own centre, in mm and in % of the mean chord', () => {
    const { balance, totals } = estimate(
      planOf([wingOf([])], { items: [item('a', 10, 20), item('b', 30, 100)] }),
    );
    expectNearly(totals.mass, 40, ROUNDING);
    expectNearly(balance.x, 80, ROUNDING);
    // Mean chord 200 mm from the datum on: 80 mm is 40 %.
    expectNearly(balance.percentMac, 40, ROUNDING);
  });

  it('has the uncertainty that each mass gives it by its distance', () => {
    const { balance, totals } = estimate(
      planOf([wingOf([])], { items: [item('a', 10, 20, 0.3), item('b', 30, 100, 0.4)] }),
    );
    // ∂x/∂m = (xᵢ − 80)/40: −1.5 and 0.5 mm per gram.
    expectNearly(balance.u, Math.hypot(1.5 * 0.3, 0.5 * 0.4), ROUNDING);
    expectNearly(balance.uPercentMac, Math.hypot(0.45, 0.2) / 2, ROUNDING);
    expectNearly(totals.u, 0.5, ROUNDING);
  });

  it('outside the range asked for is told, with how far', () => {
    const plan = planOf([wingOf([])], {
      items: [item('a', 10, 80)],
      target: { percentMac: 35, tolerance: 2 },
    });
    const notice = estimate(plan).notices.find((n) => n.code === 'balance_outside_target');
    if (notice?.code !== 'balance_outside_target') throw new Error('not told');
    expectNearly(notice.byPercentMac, 5, ROUNDING);
    expectNearly(notice.byMm, 10, ROUNDING);
    expect(codes({ ...plan, target: { percentMac: 39, tolerance: 2 } })).not.toContain(
      'balance_outside_target',
    );
  });

  it('behind the neutral point is told', () => {
    const far = planOf([wingOf([]), tailplane], { items: [item('a', 10, 190)] });
    expect(codes(far)).toContain('balance_aft_of_neutral_point');
    expect(codes(planOf([wingOf([]), tailplane], { items: [item('a', 10, 60)] }))).not.toContain(
      'balance_aft_of_neutral_point',
    );
  });
});

describe('what is missing', () => {
  it('a plan without a wing has a balance but no % of chord, no loading and no speeds', () => {
    const result = estimate(planOf([], { items: [item('a', 10, 20)] }));
    expect(result.balance).toMatchObject({ x: 20, percentMac: null, neutralPoint: null, staticMargin: null });
    expect(result.loading).toEqual({ wing: null, classArea: null, classLoading: null });
    expect(result.speeds).toEqual({ stall: null, reynolds: null });
    expect(result.notices).toContainEqual({ code: 'no_wing', path: 'plan' });
  });

  it('a plan without mass has no balance, and says so', () => {
    const result = estimate(planOf([wingOf([])]));
    expect(result.totals).toMatchObject({ mass: 0, at: null, inertia: null });
    expect(result.balance.x).toBeNull();
    expect(result.notices).toContainEqual({ code: 'no_mass', path: 'plan' });
  });

  it('a plan without a tailplane has no neutral point', () => {
    const result = estimate(planOf([wingOf([])], { items: [item('a', 10, 20)] }));
    expect(result.balance.neutralPoint).toBeNull();
    expect(result.notices).toContainEqual({ code: 'no_tailplane', path: 'plan' });
  });

  it('a part that measures nothing is told, and lies at its root', () => {
    const nothing: Part = {
      id: 'p',
      name: 'Nothing',
      material: 'balsa',
      kind: 'skin',
      from: 100,
      to: 100,
      start: 0,
      end: 0.3,
      seat: 'top',
      thickness: 1,
    };
    const result = estimate(planOf([wingOf([nothing])]));
    expect(result.notices).toContainEqual({ code: 'part_measures_nothing', path: 'wing/p' });
    expect(lineOf(result, 'wing/p')).toMatchObject({ mass: 0, at: [0, 0, 0] });
  });
});

describe('surfaces', () => {
  it('whose section crosses itself are told, with the place', () => {
    const crossed = {
      name: 'Crossed',
      points: [
        [1, 0],
        [0.5, -0.05],
        [0, 0],
        [0.5, 0.05],
        [1, 0],
      ] as [number, number][],
    };
    const wing = wingOf([]);
    const panels = wing.panels.map((p) => ({ ...p, rootSection: crossed }));
    expect(codes(planOf([{ ...wing, panels }]))).toContain('section_self_crossing');
    expect(codes(planOf([wing]))).not.toContain('section_self_crossing');
  });

  it('whose chord jumps between panels are told', () => {
    const wing = wingOf([]);
    const panels = [...wing.panels, ...wing.panels.map((p) => ({ ...p, rootChord: 180 }))];
    expect(estimate(planOf([{ ...wing, panels }])).notices).toContainEqual({
      code: 'chord_step',
      path: 'wing',
      panel: 1,
      by: -20,
    });
  });

  it('standing upright cast no shadow: a fin has no projected area and no aspect ratio', () => {
    const panels = wingOf([]).panels.map((p) => ({ ...p, dihedral: 90 }));
    const fin = estimate(planOf([{ ...wingOf([]), key: 'fin', role: 'fin', mirrored: false, panels }]))
      .planform['fin'];
    expect(fin).toMatchObject({ areaDeveloped: 100_000, areaProjected: 0, span: 0, aspectRatio: null });
  });

  it('carry their outline through the fuselage in the class area, fins left out', () => {
    const wing = { ...wingOf([]), apex: [0, 15, 0] as [number, number, number] };
    const result = estimate(planOf([wing, tailplane], { items: [item('a', 100, 20)] }));
    // 2 × 500 × 200, 30 × 200 carried through, 2 × 200 × 100 of tail.
    expectNearly(result.loading.classArea, 20 + 0.6 + 4, ROUNDING);
    expectNearly(result.loading.classLoading, 100 / 24.6, ROUNDING);
    expectNearly(result.loading.wing, 100 / 20, ROUNDING);
  });
});

describe('inertia', () => {
  it('of two weights on a bar is that of two points about their middle', () => {
    const { inertia } = estimate(planOf([], { items: [item('a', 10, -50), item('b', 10, 50)] })).totals;
    expect(inertia).toEqual({ xx: 0, yy: 50_000, zz: 50_000 });
  });

  it('of a mirrored wing about the roll axis is that of its span, though its centre is amidships', () => {
    const sheet: Part = { id: 'p', name: 'Sheet', material: 'balsa', kind: 'sheet', thickness: 1, cutout: 0 };
    const { inertia, mass } = estimate(planOf([wingOf([sheet])])).totals;
    // A flat plate 1,000 × 200 mm: m·b²/12 in roll, m·c²/12 in pitch.
    expectNearly(inertia?.xx, (mass * 1000 ** 2) / 12, ROUNDING);
    expectNearly(inertia?.yy, (mass * 200 ** 2) / 12, ROUNDING);
  });
});
