import { polygonArea, polygonCentroid } from 'd3-polygon';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import reference from '#data/reference/strips.json';
import { estimate } from '#shared/core/estimate.ts';
import { polygonIntegrals } from '#shared/core/polygon.ts';
import type { Pair, Strip } from '#shared/core/plan.ts';
import { panel, plainPlan, solidPlan, surface, UNIT_WOOD } from './plans.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

type Corner = [number, number];
const corners = (points: readonly number[][]): Corner[] =>
  points.map(([x = Number.NaN, z = Number.NaN]) => [x, z]);
const pair = ([a = Number.NaN, b = Number.NaN]: readonly number[]): Pair => [a, b];
/** The reference prints up to nine significant digits. */
const PRINTED_DIGITS = 1e-8;

describe('polygons', () => {
  test.each(reference.polygons)('$id has area $area and centroid $centroid ($source)', (row) => {
    for (const points of [corners(row.points), corners(row.points).reverse()]) {
      const found = polygonIntegrals(points);
      expectNear(found.area, row.area, SAME_SUM);
      expectNear(found.centroid?.[0], row.centroid[0] ?? Number.NaN, PRINTED_DIGITS);
      expectNear(found.centroid?.[1], row.centroid[1] ?? Number.NaN, PRINTED_DIGITS);
      // About the horizontal axis ∫z², about the upright one ∫x².
      if (row.secondMoments) {
        expectNear(found.secondZ, row.secondMoments.x, SAME_SUM);
        expectNear(found.secondX, row.secondMoments.y, SAME_SUM);
      }
      const [x = Number.NaN, z = Number.NaN] = found.centroid ?? [];
      expectNear(found.secondZ - row.area * z ** 2, row.centroidal.x, PRINTED_DIGITS);
      expectNear(found.secondX - row.area * x ** 2, row.centroidal.y, PRINTED_DIGITS);
    }
  });

  test('any star-shaped polygon has the area and centroid that d3-polygon finds, without its sign', () => {
    const reach = fc.double({ min: 1, max: 100, noNaN: true });
    const place = fc.double({ min: -1000, max: 1000, noNaN: true });
    fc.assert(
      fc.property(fc.array(reach, { minLength: 3, maxLength: 40 }), place, place, (radii, x0, z0) => {
        const points = radii.map((r, i): Corner => {
          const angle = (2 * Math.PI * i) / radii.length;
          return [x0 + r * Math.cos(angle), z0 + r * Math.sin(angle)];
        });
        const found = polygonIntegrals(points);
        const [x, z] = polygonCentroid(points);
        // Far from the origin d3 loses some five digits to cancellation.
        expectNear(found.area, Math.abs(polygonArea(points)), 1e-9);
        expect(Math.abs((found.centroid?.[0] ?? Number.NaN) - x)).toBeLessThan(1e-4);
        expect(Math.abs((found.centroid?.[1] ?? Number.NaN) - z)).toBeLessThan(1e-4);
      }),
    );
  });

  test('a plate of that outline weighs its area and hangs at its centroid', () => {
    for (const { points, area, centroid } of reference.polygons) {
      const plate = {
        shape: 'plate',
        id: 'plate',
        name: 'Plate',
        group: 'fuselage',
        material: 'unit',
        outline: corners(points),
        thickness: 2,
        count: 3,
        y: 0,
        cutout: 0.25,
      } as const;
      const [line] = estimate(solidPlan(plate)).lines;
      expectNear(line?.mass, area * 2 * 3 * 0.75 * 1e-3, SAME_SUM);
      expectNear(line?.at[0], centroid[0] ?? Number.NaN, PRINTED_DIGITS);
      expectNear(line?.at[2], centroid[1] ?? Number.NaN, PRINTED_DIGITS);
    }
  });
});

describe('tapered strips', () => {
  test.each(reference.strips)('$id as a stick: $volume mm³, centroid $x from its root ($source)', (row) => {
    const bar = {
      shape: 'bar',
      id: 'stick',
      name: 'Stick',
      group: 'fuselage',
      material: 'unit',
      from: [0, 0, 0],
      to: [row.length, 0, 0],
      width: pair(row.width),
      height: pair(row.height),
      profile: 'rectangle',
    } as const;
    const { lines, totals } = estimate(solidPlan({ ...bar, from: [0, 0, 0], to: [row.length, 0, 0] }));
    expectNear(lines[0]?.volume, row.volume, PRINTED_DIGITS);
    expectNear(lines[0]?.at[0], row.x, 3e-8);
    // Slender stick: the radius of gyration of its mass along its length.
    if (row.gyration !== null) {
      expectPrinted(Math.sqrt((totals.inertia?.yy ?? Number.NaN) / totals.mass), row.gyration, 6);
    }
  });

  test.each(reference.strips)('$id as a spar of a wing without sweep: the same volume, as far out', (row) => {
    const spar: Strip = {
      kind: 'strip',
      id: 'spar',
      name: 'Spar',
      material: 'unit',
      from: 0,
      to: row.length,
      at: [0.3, 0.3],
      seat: 'middle',
      width: pair(row.width),
      height: pair(row.height),
      profile: 'rectangle',
      letIn: true,
    };
    const wing = surface([panel({ span: row.length, rootChord: 200, tipChord: 200 })], [spar], {
      mirrored: false,
    });
    const [line] = estimate(plainPlan({ materials: { unit: UNIT_WOOD }, surfaces: [wing] })).lines;
    expectNear(line?.volume, row.volume, PRINTED_DIGITS);
    expectNear(line?.at[1], row.x, 3e-8);
    expectNear(line?.length, row.length, SAME_SUM);
  });
});

describe(`similar sections (${reference.similarSections.source})`, () => {
  test.each(reference.similarSections.rows)('a square stick tapering to $ratio', ({ ratio, volume, x }) => {
    const side = 10;
    const bar = {
      shape: 'bar',
      id: 'block',
      name: 'Block',
      group: 'fuselage',
      material: 'unit',
      from: [0, 0, 0],
      to: [1, 0, 0],
      width: [side, side * ratio],
      height: [side, side * ratio],
      profile: 'rectangle',
    } as const;
    const [line] = estimate(
      solidPlan({ ...bar, from: [0, 0, 0], to: [1, 0, 0], width: pair(bar.width), height: pair(bar.height) }),
    ).lines;
    expectNear(line?.volume, volume * side ** 2, PRINTED_DIGITS);
    expectNear(line?.at[0], x, 2e-8);
  });
});
