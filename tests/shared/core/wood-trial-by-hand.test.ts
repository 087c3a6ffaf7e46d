import { describe, expect, it } from 'vitest';
import { GRAVITY } from '#shared/core/frame.ts';
import type { Plan, PlanMaterial } from '#shared/core/plan.ts';
import { perDensity, perGram } from '#shared/core/sensitivity.ts';
import { stockNeeded } from '#shared/core/stock-needed.ts';
import { trialBase } from '#shared/core/wood-trial-base.ts';
import { runTrials, type Trial } from '#shared/core/wood-trial.ts';

const balsa = (density: number, strength: number): PlanMaterial => ({
  name: `Balsa ${density}`,
  category: 'wood',
  density,
  cv: 0.1,
  modulus: 3,
  strength,
});
const strip = {
  kind: 'strip',
  material: 'medium',
  from: 0,
  to: 500,
  at: [0.25, 0.25],
  width: [5, 5],
  height: [2, 2],
  profile: 'rectangle',
  letIn: true,
} as const;

/** A plank of 1000 × 100 mm, 10 mm thick throughout: every figure can be had with a pencil. */
const plank: Plan = {
  version: 1,
  name: 'Plank',
  materials: {
    medium: balsa(160, 20),
    light: balsa(100, 11),
    tissue: { name: 'Tissue', category: 'covering', areal: 12.5, cv: 0 },
  },
  surfaces: [
    {
      key: 'wing',
      role: 'wing',
      apex: [0, 0, 0],
      mirrored: true,
      panels: [
        {
          span: 500,
          rootChord: 100,
          tipChord: 100,
          sweep: 0,
          dihedral: 0,
          rootSection: { flat: 10 },
          tipSection: { flat: 10 },
        },
      ],
      parts: [
        {
          id: 'ribs',
          name: 'Ribs',
          kind: 'ribs',
          material: 'medium',
          from: 0,
          to: 500,
          count: 6,
          thickness: 2,
          lightening: 0,
        },
        {
          ...strip,
          id: 'top',
          name: 'Top spar',
          seat: 'top',
          at: [0.25, 0.25],
          width: [5, 5],
          height: [2, 2],
        },
        {
          ...strip,
          id: 'bottom',
          name: 'Bottom spar',
          seat: 'bottom',
          at: [0.25, 0.25],
          width: [5, 5],
          height: [2, 2],
        },
        {
          id: 'skin',
          name: 'Tissue',
          kind: 'covering',
          material: 'tissue',
          from: 0,
          to: 500,
          seat: 'top',
          overlap: 0,
        },
      ],
    },
  ],
  items: [
    { id: 'body', name: 'Body', group: 'fuselage', mass: 20, at: [200, 0, 0] },
    { id: 'lead', name: 'Lead', group: 'ballast', mass: 5, at: [-80, 0, 0] },
  ],
  solids: [],
  target: { percentMac: 30, tolerance: 2 },
  flight: { loadFactor: 4 },
};

const light = { key: 'light', material: plank.materials['light']! };
const trials: Trial[] = [
  { name: 'As drawn', materials: {} },
  { name: 'Light ribs', materials: { ribs: light } },
  { name: 'Light ribs, light top spar', materials: { ribs: light, 'wing/top': light } },
];
const near = (value: number) => expect.closeTo(value, 9) as number;

describe('a wood trial, step by step', () => {
  // Twelve ribs of 100 × 10 mm less two notches of 5 × 2 mm, 2 mm thick.
  const ribVolume = 12 * (100 * 10 - 2 * 5 * 2) * 2;
  const ribArm = (1000 * 50 - 20 * 25) / 980;
  // Each spar 1000 mm long, 25 mm behind the leading edge.
  const sparVolume = 1000 * 5 * 2;
  const tissue = 1000 * 100 * 12.5e-6;
  const [arm, wanted] = [-80, 30];

  const byHand = (ribs: number, top: number) => {
    const [ribMass, topMass, bottomMass] = [
      ribVolume * ribs * 1e-6,
      sparVolume * top * 1e-6,
      sparVolume * 160e-6,
    ];
    const wingBare = ribMass + topMass + bottomMass;
    const wingMass = wingBare + tissue;
    const bare = wingMass + 20;
    const moment = ribMass * ribArm + (topMass + bottomMass) * 25 + tissue * 50 + 20 * 200;
    const ballast = (bare * (moment / bare - wanted)) / (wanted - arm);
    return { wingBare, wingMass, bare, x: moment / bare, ballast };
  };
  // Schrenk on a rectangle: half of the load even, half an ellipse whose middle lies 4/(3π) of the half span out.
  const rootMoment = (carried: number) =>
    (carried / 1000) * GRAVITY * 4 * 0.5 * 500 * (0.5 * 0.5 + (0.5 * 4) / (3 * Math.PI));
  // Two strips of 5 × 2 mm with their middles 4 mm off the axis; the outer fibre at 5 mm.
  const inertia = 2 * (10 * 4 ** 2 + (5 * 2 ** 3) / 12);

  it('weighs, trims, loads and breaks the plank as a pencil does', () => {
    const { wanted: point, takenOff, results } = runTrials(plank, trials, { arm });
    expect([point, takenOff]).toEqual([near(30), 5]);
    const expected = [byHand(160, 160), byHand(100, 160), byHand(100, 100)];
    for (const [i, { ballast, bare, ...rest }] of expected.entries()) {
      const allUp = bare + ballast;
      expect(results[i]).toMatchObject(
        Object.fromEntries(
          Object.entries({
            ...rest,
            bare,
            ballast,
            allUp,
            added: 0,
            percentMac: rest.x,
            wingLoading: allUp / 10,
            classLoading: allUp / 10,
          }).map(([key, value]) => [key, near(value)]),
        ),
      );
    }
    for (const i of [0, 1]) {
      const { allUp, wingMass, margin, marginAt } = results[i]!;
      expect(margin).toBeCloseTo(20 / ((rootMoment(allUp! - wingMass) * 5) / inertia), 5);
      expect(marginAt).toBe(0);
    }
    // The top strip alone is of lighter wood: it gives way first, in proportion to its strength.
    expect(results[2]!.margin! / results[1]!.margin!).toBeCloseTo(
      ((11 / 20) * (results[1]!.allUp! - results[1]!.wingMass)) / (results[2]!.allUp! - results[2]!.wingMass),
      9,
    );
  });

  it('saves the ribs’ own grams and those of the nose weight that they asked for', () => {
    const [drawn, ribs] = runTrials(plank, trials, { arm }).results;
    const saved = ribVolume * 60e-6;
    expect(drawn!.bare - ribs!.bare).toBeCloseTo(saved, 9);
    expect(drawn!.allUp! - ribs!.allUp!).toBeCloseTo(saved * (1 + (ribArm - wanted) / (wanted - arm)), 9);
  });

  it('fills up to a class minimum at the balance point, so that all weigh the same', () => {
    const { results } = runTrials(plank, trials, { arm, minimumMass: 80 });
    expect(results.map(({ allUp }) => allUp)).toEqual([near(80), near(80), near(80)]);
    for (const { bare, ballast, added } of results) expect(added).toBeCloseTo(80 - bare - ballast!, 9);
    // Under a minimum that every trial passes nothing is added.
    const over = runTrials(plank, trials, { arm, minimumMass: 20 }).results;
    expect(over.map(({ added }) => added)).toEqual([0, 0, 0]);
  });

  it('costs what a gram more on each part and 10 % more of a density cost by hand', () => {
    const { fold } = trialBase(plank);
    const { bare, x } = byHand(160, 160);
    const effects = perGram(fold, { arm, wanted });
    const body = effects.find(({ name }) => name === 'Body');
    expect(effects[0]).toEqual(body);
    expect(body).toMatchObject({
      mass: 20,
      shift: near((200 - x) / bare),
      ballast: near(170 / 110),
      allUp: near(1 + 170 / 110),
    });
    // A spar lies before the wanted point: each gram of it saves ballast.
    expect(effects.find(({ name }) => name === 'Top spar')?.ballast).toBeCloseTo(-5 / 110, 9);
    const [medium] = perDensity(fold, { arm, wanted });
    const [ribs, spars] = [ribVolume * 16e-6, 2 * sparVolume * 16e-6];
    expect(medium).toMatchObject({
      material: 'medium',
      heavier: near(ribs + spars),
      ballast: near((ribs * (ribArm - 30) - spars * 5) / 110),
    });
    const after = bare + ribs + spars;
    expect(medium!.shift).toBeCloseTo((bare * x + ribs * ribArm + spars * 25) / after - x, 9);
  });

  it('takes a sheet of 2 mm for the ribs and two sticks for the spars', () => {
    expect(stockNeeded(plank)).toMatchObject([
      { form: 'sheet', thickness: 2, material: 'medium', pieces: 12, area: near(12 * 980) },
      { form: 'stick', width: 5, height: 2, material: 'medium', length: near(2000) },
    ]);
  });
});
