import { describe, expect, test } from 'vitest';
import reference from '#data/reference/sections.json';
import { nacaOrdinate } from '#shared/core/naca.ts';
import { arcBetween, areaBetween, heightAt, ordinateAt, wrapArc } from '#shared/core/section-integrals.ts';
import { readSection, type Section } from '#shared/core/section.ts';
import { expectNear, expectPrinted } from './tolerance.ts';

/** Half of the fourth decimal printed, in per cent, and the same again for the printed x, which the face's slope passes on. */
const PRINTED_POINT = 1e-4;
/** The report's own table differs from its equations by up to this, in per cent of the chord. */
const REPORT_TABLE = 0.018 + 0.005;
/**
 * A cambered contour leans at its ends: a hair of it lies before x = 0 and behind x = 1, where a section read at
 * equal x has no ordinate. Greatest for the most cambered section here.
 */
const LEANING_ENDS = { area: 3e-5, centroid: 1e-5, perimeter: 1e-5, oneFace: 2e-4 };
/** Between two nodes a section runs straight: near the nose, where it bends most, that cuts 0.0012 % of the chord. */
const BETWEEN_NODES = 0.0015;
/** Eight printed digits of an integral of a section without camber. */
const EIGHT_DIGITS = 1e-8;

const read = (naca: string): Section => readSection({ naca }, 100);
const isCambered = (naca: string) => !naca.startsWith('00');

describe('ordinates', () => {
  const { naca, rows, source } = reference.halfThickness;
  test.each(rows)(`${naca} is 2 × $z % thick at $x % (${source})`, ({ x, z }) => {
    expectPrinted(100 * nacaOrdinate(naca, x / 100, 1), z, 4);
    expectPrinted(-100 * nacaOrdinate(naca, x / 100, -1), z, 4);
  });

  const points = reference.contourPoints.flatMap((table) =>
    table.points.map((point) => ({ ...point, ...table })),
  );
  test.each(points)(
    '$naca passes through the published points $upper and $lower',
    ({ naca: code, upper, lower }) => {
      const onFace = ([x = Number.NaN, z = Number.NaN]: number[], face: 1 | -1) => {
        // The last upper point lies 0.01 % behind the chord's end, where the plan's section ends.
        if (x > 100) return;
        expect(Math.abs(100 * nacaOrdinate(code, x / 100, face) - z)).toBeLessThanOrEqual(PRINTED_POINT);
      };
      onFace(upper, 1);
      onFace(lower, -1);
    },
  );

  const vertical = reference.ordinates.flatMap((table) =>
    table.rows.map((row) => ({ ...row, naca: table.naca })),
  );
  test.each(vertical)(
    '$naca on the vertical at $x %: $upper and $lower',
    ({ naca: code, x, upper, lower }) => {
      expectPrinted(100 * nacaOrdinate(code, x / 100, 1), upper, 4);
      expectPrinted(100 * nacaOrdinate(code, x / 100, -1), lower, 4);
      const section = read(code);
      expect(Math.abs(100 * ordinateAt(section, 'upper', x / 100) - upper)).toBeLessThan(BETWEEN_NODES);
      expect(Math.abs(100 * ordinateAt(section, 'lower', x / 100) - lower)).toBeLessThan(BETWEEN_NODES);
    },
  );

  const printed = reference.reportOrdinates.flatMap((table) =>
    table.rows.map((row) => ({ ...row, naca: table.naca })),
  );
  test.each(printed)(
    '$naca at $x % agrees with the report’s two decimals',
    ({ naca: code, x, upper, lower }) => {
      expect(Math.abs(100 * nacaOrdinate(code, x / 100, 1) - upper)).toBeLessThan(REPORT_TABLE);
      expect(Math.abs(100 * nacaOrdinate(code, x / 100, -1) - lower)).toBeLessThan(REPORT_TABLE);
    },
  );
});

describe(`closed forms of the symmetric sections (${reference.closedForms.source})`, () => {
  const { areaPerThickness, centroidX, tailThickness, thicknesses } = reference.closedForms;
  test.each(thicknesses)('00%s: area K·t·c², centroid at 42 % of the chord, open tail', (digits) => {
    const section = read(`00${digits}`);
    const area = areaBetween(section, 0, 1);
    const thickness = Number(digits) / 100;
    expectNear(area.amount, areaPerThickness * thickness, 1e-7);
    expectPrinted(area.x / area.amount, centroidX, 7);
    expect(Math.abs(area.z)).toBeLessThan(1e-15);
    expectNear(heightAt(section, 1), tailThickness * thickness, 1e-9);
  });
});

describe(`areas, centroids and arcs (${reference.integrals.source})`, () => {
  test.each(reference.integrals.rows)(
    '$naca: area $area with its centroid at $x, $z',
    ({ naca, area, x, z }) => {
      const found = areaBetween(read(naca), 0, 1);
      const cambered = isCambered(naca);
      expectNear(found.amount, area, cambered ? LEANING_ENDS.area : EIGHT_DIGITS);
      expect(Math.abs(found.x / found.amount - x)).toBeLessThan(
        cambered ? LEANING_ENDS.centroid : EIGHT_DIGITS,
      );
      expect(Math.abs(found.z / found.amount - z)).toBeLessThan(
        cambered ? LEANING_ENDS.centroid : EIGHT_DIGITS,
      );
    },
  );

  test.each(reference.integrals.rows)(
    '$naca: developed length $upperArc over the top, $lowerArc below',
    (row) => {
      const section = read(row.naca);
      const upper = arcBetween(section, 'upper', 0, 1).amount;
      const lower = arcBetween(section, 'lower', 0, 1).amount;
      const around = wrapArc(section, 1, 1);
      const cambered = isCambered(row.naca);
      expectNear(
        around.amount,
        row.upperArc + row.lowerArc,
        cambered ? LEANING_ENDS.perimeter : EIGHT_DIGITS,
      );
      expectNear(upper, row.upperArc, cambered ? LEANING_ENDS.oneFace : EIGHT_DIGITS);
      expectNear(lower, row.lowerArc, cambered ? LEANING_ENDS.oneFace : EIGHT_DIGITS);
      if (row.arcCentroid) {
        expect(Math.abs(around.x / around.amount - row.arcCentroid.x)).toBeLessThan(2e-6);
        expect(Math.abs(around.z / around.amount - row.arcCentroid.z)).toBeLessThan(2e-6);
      }
    },
  );

  test('camber adds less than 0.4 % to the area of a rib: the plain closed form is no test of a cambered one', () => {
    const plain = areaBetween(read('0012'), 0, 1).amount;
    const cambered = areaBetween(read('4412'), 0, 1).amount;
    expect(cambered / plain - 1).toBeGreaterThan(0.003);
    expect(cambered / plain - 1).toBeLessThan(0.004);
  });
});

describe(`nose sheets from 30 % round the nose (${reference.noseSheets.source})`, () => {
  test.each(reference.noseSheets.rows)(
    '$naca: $total of the chord',
    ({ naca, upperArc, lowerArc, total, centroidX }) => {
      const section = read(naca);
      const around = wrapArc(section, 0.3, 0.3);
      const upper = arcBetween(section, 'upper', 0, 0.3).amount;
      // Seven decimals printed; a cut between two nodes of the section is measured along their chord.
      expectNear(around.amount, total, 1e-6);
      expectNear(upper, upperArc, LEANING_ENDS.oneFace);
      expectNear(arcBetween(section, 'lower', 0, 0.3).amount, lowerArc, 1e-6);
      if (centroidX !== null) expectPrinted(around.x / around.amount, centroidX, 6);
    },
  );
});

describe('sections given by coordinates', () => {
  const { naca, stations, area, source } = reference.fewStations;
  test(`17 stations of the ${naca} joined by straight lines have the area of their trapezoids (${source})`, () => {
    const at = (percent: number, face: 1 | -1): [number, number] => [
      percent / 100,
      nacaOrdinate(naca, percent / 100, face),
    ];
    const points = [
      ...stations.toReversed().map((x) => at(x, 1)),
      ...stations.slice(1).map((x) => at(x, -1)),
    ];
    const section = readSection({ name: 'few stations', points }, 100);
    expectPrinted(areaBetween(section, 0, 1).amount, area, 6);
  });

  test('a fine set of coordinates of the 4412 weighs what the formula’s section weighs', () => {
    const xs = Array.from({ length: 161 }, (_, i) => (1 - Math.cos((i * Math.PI) / 160)) / 2);
    const face = (sign: 1 | -1) => xs.map((x): [number, number] => [x, nacaOrdinate('4412', x, sign)]);
    const points = [...face(1).reverse(), ...face(-1)];
    const byPoints = readSection({ name: '160 per face', points }, 100);
    const byFormula = read('4412');
    // Relative error of a polygon with 160 cosine intervals a face: −6.3e-5 in area, −8.8e-6 in perimeter (constructed).
    expectNear(areaBetween(byPoints, 0, 1).amount, areaBetween(byFormula, 0, 1).amount, 7e-5);
    expectNear(wrapArc(byPoints, 1, 1).amount, wrapArc(byFormula, 1, 1).amount, 1e-3);
  });
});
