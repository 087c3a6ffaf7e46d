import { describe, expect, test } from 'vitest';
import reference from '#data/reference/parts.json';
import { estimate } from '#shared/core/estimate.ts';
import type { Part, PlanMaterial } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { panel, plainPlan, surface } from './plans.ts';
import { expectNear, expectPrinted } from './tolerance.ts';

const { chord, span, source } = reference;
/** A cambered section is read at equal x: a hair of it leans out before x = 0 and behind x = 1. */
const LEANING_ENDS = 5e-6;

function lineOf(naca: string, part: Part, material: Partial<PlanMaterial>): Line {
  const section = { naca };
  const wing = surface(
    [panel({ span, rootChord: chord, tipChord: chord, rootSection: section, tipSection: section })],
    [part],
    { mirrored: false },
  );
  const materials = { stock: { name: 'Stock', category: 'wood', cv: 0.1, ...material } as const };
  const [line] = estimate(plainPlan({ materials, surfaces: [wing] })).lines;
  if (!line) throw new Error('the part has no line');
  return line;
}

const base = { id: 'part', name: 'Part', material: 'stock' };

describe(`parts of a wing of constant chord (${source})`, () => {
  test.each(reference.ribs)(
    'a rib $naca weighs $mass g, centroid $x mm aft',
    ({ naca, thickness, density, ...rib }) => {
      const part: Part = { ...base, kind: 'ribs', stations: [span / 2], thickness, lightening: 0 };
      const line = lineOf(naca, part, { density });
      expectNear(line.area, rib.area, LEANING_ENDS);
      expectNear(line.mass, rib.mass, LEANING_ENDS);
      expectNear(line.at[0], rib.x, LEANING_ENDS);
      expectNear(line.u, 0.1 * rib.mass, LEANING_ENDS);
    },
  );

  test.each(reference.coverings)('covering over both faces of $naca takes $area mm²', ({ naca, area }) => {
    const part: Part = { ...base, kind: 'covering', from: 0, to: span, seat: 'both', overlap: 0 };
    const line = lineOf(naca, part, { density: undefined, areal: 100 });
    expectNear(line.area, area, LEANING_ENDS);
    expectNear(line.mass, area * 1e-4, LEANING_ENDS);
  });

  test('twenty-four equal ribs, a twelfth cut out of each, weigh twenty-two', () => {
    const [row] = reference.ribs;
    const one: Part = { ...base, kind: 'ribs', stations: [0], thickness: 1.5, lightening: 0 };
    const many: Part = {
      ...base,
      kind: 'ribs',
      from: 0,
      to: span,
      count: 24,
      thickness: 1.5,
      lightening: 1 / 12,
    };
    const line = lineOf(row?.naca ?? '', many, { density: 130 });
    expect(line.pieces).toBe(24);
    expectNear(line.mass, 22 * lineOf(row?.naca ?? '', one, { density: 130 }).mass, 1e-12);
  });

  const { naca, end, thickness, density, length, mass } = reference.noseSheet;
  test('sheeting from 30 % round the nose back to 30 % weighs its developed length', () => {
    const part: Part = { ...base, kind: 'skin', from: 0, to: span, start: end, end, seat: 'wrap', thickness };
    const line = lineOf(naca, part, { density });
    // A cut between two nodes of the section is measured along their chord: 1e-7 of it.
    expectNear(line.area, length * span, 1e-7);
    expectNear(line.mass, mass, 1e-6);
    expectPrinted(line.mass, mass, 5);
  });
});
