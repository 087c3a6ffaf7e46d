import { describe, expect, it, test } from 'vitest';
import reference from '#data/reference/bending.json';
import { estimate } from '#shared/core/estimate.ts';
import type { Strip } from '#shared/core/plan.ts';
import { bendingMoment, ellipticMoment, schrenkLoad, type SpanLoad } from '#shared/core/span-load.ts';
import { bendingStiffness, worstFlange, type Flange } from '#shared/core/spar.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

const taper = (root: number, tip: number, semiSpan: number): SpanLoad => ({
  semiSpan,
  area: ((root + tip) / 2) * semiSpan,
  panels: [{ from: 0, to: semiSpan, chord: [root, tip] }],
  tip: { from: semiSpan, chord: tip, length: 0 },
});

test.each(reference.elliptic.rows)(
  `elliptic load at %d of the span (${reference.elliptic.source})`,
  (eta, share) => {
    expectPrinted(ellipticMoment(eta ?? 0), share ?? 0, 6);
  },
);

test.each(reference.schrenk.rows)(
  `Schrenk at %d of the span (${reference.schrenk.source})`,
  (eta, chord, load) => {
    // The chord is printed to six decimals, so half a unit of it is in the load too.
    expect(Math.abs(schrenkLoad(chord ?? 0, eta ?? 0) - (load ?? 0))).toBeLessThan(1e-6);
  },
);

test.each(reference.schrenkCentres.rows)(
  `taper %d has its load's centre there (${reference.schrenkCentres.source})`,
  (ratio, centre) => {
    const load = taper(200, 200 * (ratio ?? 1), 1000);
    expectPrinted(bendingMoment(load, 1, 0) / 1000, centre ?? 0, 6);
  },
);

const flange = (width: number, height: number, z: number, modulus = 1): Flange => ({
  area: width * height,
  height,
  z,
  modulus,
  strength: 1,
});

test.each(reference.equalCaps.rows)(
  `two caps $width × $thickness at depth $depth (${reference.equalCaps.source})`,
  (row) => {
    const z = (row.depth - row.thickness) / 2;
    const caps = [flange(row.width, row.thickness, z), flange(row.width, row.thickness, -z)];
    expectPrinted(bendingStiffness(caps)?.stiffness, row.secondMoment, 5);
    // Stress under a unit moment is one over the section modulus.
    expectPrinted(1 / (worstFlange(caps, 1)?.stress ?? Number.NaN), row.sectionModulus, 5);
  },
);

test.each(reference.unequalCaps.rows)(
  `unequal caps, stiffness ratio $ratio (${reference.unequalCaps.source})`,
  (row) => {
    const found = bendingStiffness([flange(6, 2, 9, row.ratio), flange(4, 2, 1)]);
    expectPrinted(found?.axis, row.axis, 6);
    expectPrinted(found?.stiffness, row.secondMoment, 5);
  },
);

test.each(reference.balsaWing.rows)(`balsa wing, root chord $root (${reference.balsaWing.source})`, (row) => {
  const { force, semiSpan, stress, density } = reference.balsaWing;
  // The problem shares the force as the chord does; Schrenk's other half is taken off to compare.
  const load = taper(row.root, row.tip, semiSpan);
  const byChord = (y: number) =>
    2 * bendingMoment(load, force, y) -
    ((force * semiSpan * 4) / (3 * Math.PI)) * ellipticMoment(y / semiSpan);
  // Chords and moments are printed to six digits.
  expectNear(byChord(0), row.moment, 2e-6);
  expectNear(byChord(semiSpan / 2), row.middleMoment, 2e-6);
  const depthAt = (y: number) =>
    (row.separation * (row.root + (row.tip - row.root) * (y / semiSpan))) / row.root;
  const capAreaAt = (y: number) => byChord(y) / depthAt(y) / stress;
  expectNear(capAreaAt(0), row.capArea, 2e-6);
  // Four caps, each as thick as its stress asks all along a half: the middle rule over a thousand slices.
  const slices = 1000;
  const slice = semiSpan / slices;
  const volume = Array.from({ length: slices }, (_, i) => capAreaAt((i + 0.5) * slice) * slice);
  const mass = (4 * volume.reduce((sum, v) => sum + v, 0) * density) / 1e6;
  expectNear(mass, row.capsMass, 1e-5);
});

describe('the spar of a drawn wing', () => {
  const spar = (seat: 'top' | 'bottom'): Strip => ({
    id: seat,
    name: seat,
    kind: 'strip',
    material: 'spruce',
    from: 0,
    to: 500,
    at: [0.3, 0.3],
    seat,
    width: [6, 6],
    height: [2, 2],
    profile: 'rectangle',
    letIn: true,
  });
  const spruce = {
    name: 'Spruce',
    category: 'wood' as const,
    density: 450,
    cv: 0.1,
    modulus: 10,
    strength: 70,
  };
  const plate = { flat: 20 };
  const panels = wingOf([]).panels.map((p) => ({ ...p, rootSection: plate, tipSection: plate }));
  const plan = planOf([wingOf([spar('top'), spar('bottom')], { panels })], {
    materials: { spruce },
    items: [{ id: 'load', name: 'Load', group: 'gear', mass: 300, at: [60, 0, 0] }],
    flight: { loadFactor: 5 },
  });

  it('carries what the model weighs beside its wing, by Schrenk, on two caps', () => {
    const { spar: found } = estimate(plan);
    const root = found.stations[0];
    // 300 g × 5 g on two halves, centre of a rectangle's load by Schrenk at 0.462207 of 500 mm.
    const moment = ((0.3 * 9.80665 * 5) / 2) * 500 * 0.462207;
    expectNear(root?.moment, moment, 1e-6);
    // Depth 20, caps 6 × 2: I = 6·(20³ − 16³)/12, stress at the outer fibre 10 mm out.
    const stress = (moment * 10) / ((6 * (20 ** 3 - 16 ** 3)) / 12);
    expectNear(root?.stress, stress, 1e-6);
    expectNear(root?.margin, 70 / stress, 1e-6);
    expect(found.worst).toBe(0);
  });

  it('has twice the margin at half the load factor', () => {
    const half = estimate({ ...plan, flight: { loadFactor: 2.5 } });
    const [a, b] = [estimate(plan).spar.stations[3], half.spar.stations[3]];
    expectNear(b?.margin, 2 * (a?.margin ?? 0), SAME_SUM);
  });

  it('is not answered where no strip has a strength', () => {
    const { modulus, strength, ...unknown } = spruce;
    expect(modulus * strength).toBeGreaterThan(0);
    expect(estimate({ ...plan, materials: { spruce: unknown } }).spar).toEqual({ stations: [], worst: null });
  });
});
