import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import ploverJson from '#data/demo/gliders/plover.json' with { type: 'json' };
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import { estimate } from '#shared/core/estimate.ts';
import { noseOf, tipOf } from '#shared/core/extent.ts';
import type { Plan, PlanMaterial } from '#shared/core/plan.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import { runTrials } from '#shared/core/wood-trial.ts';
import { withWood, woodGroups } from '#shared/core/wood-groups.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const balsa = (density: number): PlanMaterial => ({
  name: `Balsa ${density}`,
  category: 'wood',
  density,
  cv: 0.1,
});

/** A plate wing 2 × 300 × 100 mm, 2 mm thick, of which half the wood is cut out, and a stick: figures by hand. */
const plate: Plan = {
  version: 1,
  name: 'Plate',
  materials: {
    soft: balsa(100),
    hard: balsa(200),
    glue: { name: 'Glue', category: 'adhesive', density: 1, cv: 0 },
  },
  surfaces: [
    {
      key: 'wing',
      role: 'wing',
      apex: [0, 0, 0],
      mirrored: true,
      panels: [
        {
          span: 300,
          rootChord: 100,
          tipChord: 100,
          sweep: 0,
          dihedral: 0,
          rootSection: { flat: 2 },
          tipSection: { flat: 2 },
        },
      ],
      parts: [{ id: 'sheet', name: 'Sheet', kind: 'sheet', material: 'hard', thickness: 2, cutout: 0.5 }],
    },
  ],
  items: [{ id: 'lead', name: 'Lead', group: 'Ballast', mass: 12, at: [-100, 0, 0] }],
  solids: [],
};
const plover = planSchema.parse(ploverJson);
const whimbrel = planSchema.parse(whimbrelJson);
const own = (plan: Plan) =>
  Object.fromEntries(
    woodGroups(plan)
      .filter(({ materials }) => materials.length === 1)
      .map(({ key, materials: [material = ''] }) => [
        key,
        { key: material, material: plan.materials[material] ?? balsa(1) },
      ]),
  );

describe('runTrials', () => {
  it('weighs, trims and loads a plate wing as by hand', () => {
    // 60,000 mm² · 2 mm · ½ = 60,000 mm³: 12 g hard, 6 g soft, at 50 mm. Wanted at 30 mm, lead at −100 mm:
    // 12·(50 − 30)/(30 + 100) = 24/13 g and half of it. Area 6 dm².
    const plan = { ...plate, target: { percentMac: 30, tolerance: 2 } };
    const soft = { sheet: { key: 'soft', material: balsa(100) } };
    const run = runTrials(
      plan,
      [
        { name: 'hard', materials: {} },
        { name: 'soft', materials: soft },
      ],
      { arm: -100 },
    );
    expect(run).toMatchObject({ wanted: 30, takenOff: 12 });
    expect(
      run.results.map((r) => [r.wingMass, r.bare, r.ballast, r.wingLoading].map((v) => v?.toFixed(6))),
    ).toEqual([
      ['12.000000', '12.000000', (24 / 13).toFixed(6), ((12 + 24 / 13) / 6).toFixed(6)],
      ['6.000000', '6.000000', (12 / 13).toFixed(6), ((6 + 12 / 13) / 6).toFixed(6)],
    ]);
    expect(run.results.map((r) => r.percentMac?.toFixed(6))).toEqual(['50.000000', '50.000000']);
  });

  it('finds the ballast of the plan again when the trial changes nothing and the point is its own', () => {
    const run = runTrials(plate, [{ name: 'as drawn', materials: {} }], { arm: -100 });
    expect(run.results[0]?.ballast).toBeCloseTo(12, 9);
    expect(run.results[0]?.allUp).toBeCloseTo(estimate(plate).totals.mass, 9);
  });

  it.each([
    ['Plover', plover],
    ['Whimbrel', whimbrel],
  ])('gives the plan itself for the woods that %s is drawn in', (_, demo) => {
    // One piece of ballast, so that one arm can find it again.
    const [lead] = demo.items.filter(isBallast);
    const arm = lead?.at[0] ?? -100;
    const plan: Plan = { ...demo, items: demo.items.filter((item) => !isBallast(item) || item === lead) };
    const untargeted: Plan = { ...plan, target: undefined };
    const { results } = runTrials(untargeted, [{ name: 'own', materials: own(plan) }], { arm });
    const { totals, loading } = estimate(plan);
    expect(results[0]?.wingMass).toBeCloseTo(totals.wingMass, 9);
    expect(results[0]?.allUp).toBeCloseTo(totals.mass, 6);
    expect(results[0]?.wingLoading).toBeCloseTo(loading.wing ?? Number.NaN, 6);
  });

  it('ends on the wanted balance point whatever the wood', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...woodGroups(plover)),
        fc.integer({ min: 60, max: 500 }),
        ({ key }, density) => {
          const woods = { [key]: { key: 'trial', material: balsa(density) } };
          const plan: Plan = { ...plover, target: undefined };
          const { wanted, results } = runTrials(plan, [{ name: 'trial', materials: woods }], { arm: -150 });
          const ballast = results[0]?.ballast ?? 0;
          const lead = {
            id: 'trim',
            name: 'Trim',
            group: 'ballast',
            mass: ballast,
            at: [-150, 0, 0] as [number, number, number],
          };
          const bare = plan.items.filter((item) => !isBallast(item));
          const trimmed = estimate({ ...withWood(plan, woods), items: [...bare, lead] });
          expect(trimmed.balance.x).toBeCloseTo(wanted ?? Number.NaN, 6);
          expect(trimmed.totals.mass).toBeCloseTo(results[0]?.allUp ?? Number.NaN, 6);
        },
      ),
      { numRuns: 25 },
    );
  });

  it('refuses a nose-heavy model with what would have to come off', () => {
    const plan = { ...plate, target: { percentMac: 60, tolerance: 2 } };
    const { results } = runTrials(plan, [{ name: 'as drawn', materials: {} }], { arm: -100 });
    expect(results[0]).toMatchObject({ ballast: null, allUp: null, wingLoading: null });
    expect(results[0]?.refused).toMatchObject({
      refused: 'wrong_side',
      takeOff: expect.closeTo(0.75, 9) as number,
    });
  });

  it('refuses a plan without a mass', () => {
    const { results } = runTrials({ ...plate, surfaces: [], items: [] }, [{ name: 'none', materials: {} }], {
      arm: 0,
    });
    expect(results[0]).toMatchObject({ refused: { refused: 'no_mass' }, percentMac: null });
  });
});

describe('woodGroups', () => {
  it('tells spars from stringers by their width, and edges by their seat', () => {
    const strip = {
      kind: 'strip',
      material: 'soft',
      from: 0,
      to: 300,
      at: [0.3, 0.3],
      height: [2, 2],
      profile: 'rectangle',
    } as const;
    const [wing] = plate.surfaces;
    const parts = [
      { ...strip, id: 'spar', name: 'Spar', seat: 'top', width: [5, 2] },
      { ...strip, id: 'stringer', name: 'Stringer', seat: 'top', width: [3, 3] },
      { ...strip, id: 'edge', name: 'Edge', seat: 'nose', width: [5, 5] },
      { ...strip, id: 'own', name: 'Own', seat: 'tail', width: [5, 5], group: ' Aileron' },
      { id: 'glue', name: 'Glue', kind: 'glue', material: 'glue', method: 'share', share: 0.05 },
    ] as const;
    const surfaces = wing
      ? [{ ...wing, parts: parts.map((part) => ({ ...part })) as unknown as typeof wing.parts }]
      : [];
    expect(woodGroups({ ...plate, surfaces }).map(({ key }) => key)).toEqual([
      'spars',
      'stringers',
      'edges',
      'aileron',
    ]);
  });
});

describe('withWood', () => {
  it('keeps another material of the same key apart', () => {
    const changed = withWood(plate, { sheet: { key: 'soft', material: balsa(77) } });
    expect(changed.materials['soft']?.density).toBe(100);
    expect(changed.surfaces[0]?.parts[0]?.material).toBe('soft-2');
    expect(changed.materials['soft-2']?.density).toBe(77);
  });
});

describe('noseOf and tipOf', () => {
  it('find the foremost place and the wing tip', () => {
    expect(noseOf(plate)).toEqual([-100, 0, 0]);
    expect(noseOf({ ...plate, items: [], surfaces: [] })).toBeNull();
    expect(tipOf(plate)).toEqual([0, 300, 0]);
    expect(tipOf(plate, 'tailplane')).toBeNull();
  });
});
