import { describe, expect, it, test } from 'vitest';
import table from '#data/materials.json';
import reference from '#data/reference/materials.json';
import { BALSA_GRADES, balsaGrade, densityOf } from '#shared/core/grades.ts';
import { convert } from '#shared/units/units.ts';
import { expectNear, SAME_SUM } from './tolerance.ts';

test.each(reference.balsaGrades.rows)(`$key is $kgPerM3 kg/m³ (${reference.balsaGrades.source})`, (row) => {
  const [from = Number.NaN, to = Number.NaN] = row.kgPerM3;
  expect(BALSA_GRADES.find(({ key }) => `balsa-${key}` === row.key)).toMatchObject({ from, to });
  expect(`balsa-${balsaGrade(from)}`).toBe(row.key);
  expect(`balsa-${balsaGrade(to - 0.001)}`).toBe(row.key);
  expect(`balsa-${balsaGrade(to)}`).not.toBe(row.key);
});

describe('the grades of balsa', () => {
  it('join from the lightest to the heaviest, and their middles are the materials table', () => {
    expect(BALSA_GRADES.slice(1).map(({ from }) => from)).toEqual(
      BALSA_GRADES.slice(0, -1).map(({ to }) => to),
    );
    for (const { key, from, to } of BALSA_GRADES) {
      expect(table.materials.find((row) => row.key === `balsa-${key}`)?.density).toBe((from + to) / 2);
    }
  });

  it('say of wood beyond them that it is beyond', () => {
    expect([63.9, 264].map(balsaGrade)).toEqual(['under', 'over']);
  });
});

const sheets = reference.sheetMasses.rows.flatMap(({ thicknessIn: [over = 1, under = 1], grams }) =>
  grams.map((mass, i) => ({ over, under, mass, pounds: reference.sheetMasses.lbPerFt3[i] ?? Number.NaN })),
);
test.each(sheets)(
  `a 3 × 36 in sheet of $over/$under in that weighs $mass g is of $pounds lb/ft³ (${reference.sheetMasses.source})`,
  ({ over, under, mass, pounds }) => {
    const volume = convert(36, 'in', 'mm') * convert(3, 'in', 'mm') * convert(over / under, 'in', 'mm');
    // Masses are printed to 0.1 g.
    expectNear(densityOf(mass, volume), convert(pounds, 'lb/ft3', 'kg/m3'), 0.05 / mass);
  },
);

test.each(reference.metricSheets.rows)(
  `a 1000 × 100 mm sheet of $thickness mm that weighs $grams g is of $density kg/m³ (${reference.metricSheets.source})`,
  ({ thickness, density, grams }) => {
    expectNear(densityOf(grams, 1000 * 100 * thickness), density, SAME_SUM);
  },
);

it('tells no density without a size or a mass', () => {
  expect(densityOf(0, 1)).toBeNull();
  expect(densityOf(5, 0)).toBeNull();
});
