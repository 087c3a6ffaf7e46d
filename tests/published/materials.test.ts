import { describe, expect, test } from 'vitest';
import table from '#data/materials.json';
import reference from '#data/reference/materials.json';
import { gramsOfArea, gramsOfVolume } from '#shared/core/frame.ts';
import { materialInput } from '#shared/schemas/material.ts';
import { convert } from '#shared/units/units.ts';
import { expectNear, expectPrinted } from './tolerance.ts';

/** A printed 64 kg/m³ for 4 lb/ft³ (64.07): the table rounds to whole steps of 4 and 8. */
const ROUND_BAND = 0.002;
/** The table keeps two or three digits of modulus and strength. */
const TWO_DIGITS = 0.01;

const byKey = new Map(table.materials.map((material) => [material.key, material]));
const row = (key: string) => {
  const found = byKey.get(key);
  if (!found) throw new Error(`${key} is not in the table.`);
  return found;
};
const densityOf = (key: string) => row(key).density ?? Number.NaN;
const inches = ([over, under]: number[]) => convert((over ?? Number.NaN) / (under ?? Number.NaN), 'in', 'mm');
const kgPerM3 = (lbPerFt3: number) => convert(lbPerFt3, 'lb/ft3', 'kg/m3');
const sheetInches = (wide: number, long: number) => convert(wide, 'in', 'mm') * convert(long, 'in', 'mm');

describe('the materials table', () => {
  test('has every row the trade needs, each fit to be saved as it stands', () => {
    expect(table.materials.length).toBeGreaterThanOrEqual(50);
    for (const { key, ...fields } of table.materials) {
      const parsed = materialInput.safeParse({ ...fields, shared: true });
      expect(parsed.success, `${key}: ${parsed.error?.message}`).toBe(true);
      expect(key).toMatch(/^[a-z][a-z0-9.-]*$/);
    }
  });

  test('gives each row one key and one name of its own', () => {
    expect(byKey.size).toBe(table.materials.length);
    expect(new Set(table.materials.map((material) => material.name)).size).toBe(table.materials.length);
  });

  test('measures each row in exactly one way, by volume, by area or by joint, and gives its spread', () => {
    for (const { key, density, areal, spread, cv } of table.materials) {
      expect([density, areal, spread].filter((figure) => figure !== null).length, key).toBe(1);
      expect(cv, key).toBeGreaterThan(0);
      expect(cv, key).toBeLessThanOrEqual(0.4);
    }
  });

  test('says of each row where it comes from, and how sure that is', () => {
    for (const { key, source, basis, form } of table.materials) {
      expect(source.length, key).toBeGreaterThan(10);
      expect(form.length, key).toBeGreaterThan(5);
      if (basis === 'from memory') expect(source, key).toMatch(/from memory/i);
      if (source.startsWith('Common practice, no source')) expect(basis, key).toBe('common practice');
      if (source.startsWith('From memory')) expect(basis, key).toBe('from memory');
    }
  });

  test('gives every wood the moisture at which its figures hold, and a stiffness and strength', () => {
    for (const wood of table.materials.filter((material) => material.category === 'wood')) {
      expect(wood.moisture, wood.key).toBeGreaterThan(0.05);
      expect(wood.modulus, wood.key).toBeGreaterThan(1);
      expect(wood.strength, wood.key).toBeGreaterThan(5);
    }
  });

  test('has rows of every category', () => {
    expect(new Set(table.materials.map((material) => material.category))).toEqual(
      new Set(['wood', 'composite', 'metal', 'sheet', 'covering', 'finish', 'adhesive']),
    );
  });
});

describe('balsa grades', () => {
  test.each(reference.balsaGrades.rows)(
    '$key lies in the middle of its band',
    ({ key, lbPerFt3, kgPerM3: band }) => {
      const [low = Number.NaN, high = Number.NaN] = band;
      expect(densityOf(key)).toBe((low + high) / 2);
      expectNear(kgPerM3(lbPerFt3[0] ?? Number.NaN), low, ROUND_BAND);
      expectNear(kgPerM3(lbPerFt3[1] ?? Number.NaN), high, ROUND_BAND);
      // evenly spread over the band: standard deviation = width / √12
      expectPrinted(row(key).cv, (high - low) / Math.sqrt(12) / densityOf(key), 3);
    },
  );

  test('the bands touch: no density falls between two grades', () => {
    const bands = reference.balsaGrades.rows.map((grade) => grade.kgPerM3);
    bands.slice(1).forEach(([low], i) => expect(low).toBe(bands[i]?.[1]));
  });

  test.each(reference.balsaGrades.rows)('$key is as stiff and strong as its density says', ({ key }) => {
    const { modulusMPaPerKgM3, strengthMPaPerKgM3 } = reference.balsaLaw;
    expectNear((row(key).modulus ?? Number.NaN) * 1000, densityOf(key) * modulusMPaPerKgM3, TWO_DIGITS);
    expectNear(row(key).strength, densityOf(key) * strengthMPaPerKgM3, TWO_DIGITS);
  });

  test('each grade’s note tells the grain cuts apart and says that they do not change the density', () => {
    for (const { key } of reference.balsaGrades.rows) {
      expect(row(key).form).toMatch(/A cut .*C cut .*B cut .*does not change the density/);
    }
  });
});

describe('conversions', () => {
  test.each(reference.densityConversions.rows)(
    '%d lb/ft³ is %d kg/m³',
    (pounds = Number.NaN, printed = Number.NaN) => {
      expectPrinted(kgPerM3(pounds), printed, 1);
    },
  );

  test.each(reference.arealConversions.rows)('$value $from is $is $to', ({ value, from, to, is, digits }) => {
    expectPrinted(convert(value, from as 'oz/ft2', to as 'g/m2'), is, digits);
  });

  test.each(reference.speciesAt12Percent.rows)(
    '$key at 12 % moisture weighs $kgPerM3 kg/m³, a ninth more than its specific gravity says',
    ({ key, specificGravity, kgPerM3: density }) => {
      expectPrinted(specificGravity * 1000 * 1.12, density, 0);
      expect(densityOf(key)).toBe(density);
    },
  );
});

describe('stock', () => {
  const { rows, lbPerFt3 } = reference.sheetMasses;
  const cells = rows.flatMap(({ thicknessIn, grams }) =>
    grams.map((gram, i) => ({ thicknessIn, pounds: lbPerFt3[i] ?? Number.NaN, gram })),
  );
  test.each(cells)('a 3 × 36 in sheet $thicknessIn in thick at $pounds lb/ft³ weighs $gram g', (cell) => {
    const volume = inches(cell.thicknessIn) * sheetInches(3, 36);
    expectPrinted(gramsOfVolume(volume, kgPerM3(cell.pounds)), cell.gram, 1);
  });

  test('1/32 × 3 × 36 in at 6 lb/ft³ weighs 3/16 oz', () => {
    const { thicknessIn, lbPerFt3: pounds, ounces } = reference.sheetCheckPoint;
    const grams = gramsOfVolume(inches(thicknessIn) * sheetInches(3, 36), kgPerM3(pounds));
    // 108 in² × 1/32 in = 3.375 in³ = 3.375/1728 ft³; × 6 lb × 16 oz = 0.1875 oz
    expectNear(convert(grams, 'g', 'oz'), ounces, 1e-13);
  });

  test.each(reference.metricSheets.rows)(
    'a metre of 100 mm sheet, $thickness mm at $density kg/m³: $grams g',
    (s) => {
      expectNear(gramsOfVolume(1000 * 100 * s.thickness, s.density), s.grams, 1e-13);
    },
  );

  const rods = reference.gramsPerMetre.round.flatMap(({ key, diameters, grams, decimals }) =>
    diameters.map((diameter, i) => ({
      key,
      diameter,
      gram: grams[i] ?? Number.NaN,
      digits: decimals[i] ?? 9,
    })),
  );
  test.each(rods)('a metre of $key, $diameter mm, weighs $gram g', ({ key, diameter, gram, digits }) => {
    expectPrinted(gramsOfVolume((Math.PI / 4) * diameter ** 2 * 1000, densityOf(key)), gram, digits);
  });

  const strips = reference.gramsPerMetre.flat.flatMap(({ key, sizes, grams }) =>
    sizes.map(([wide = Number.NaN, high = Number.NaN], i) => ({
      key,
      wide,
      high,
      gram: grams[i] ?? Number.NaN,
    })),
  );
  test.each(strips)('a metre of $key, $wide × $high mm, weighs $gram g', ({ key, wide, high, gram }) => {
    expectPrinted(gramsOfVolume(wide * high * 1000, densityOf(key)), gram, 2);
  });

  test.each(reference.plyMeasured.rows)(
    '$key weighs by area what the weighed sheet did',
    ({ key, ounces, gramsPerM2 }) => {
      const areaM2 = convert(sheetInches(12, 48), 'mm2', 'm2');
      expectPrinted(convert(ounces, 'oz', 'g') / areaM2, gramsPerM2, 0);
      expect(row(key).areal).toBe(gramsPerM2);
    },
  );

  test.each(reference.filmByThickness.rows)(
    '$key weighs $gramsPerM2 g/m²',
    ({ key, micrometres, gramsPerM2 }) => {
      expectNear(row(key).areal, gramsOfVolume(micrometres * 1e-3 * 1e6, 1390), 1e-3);
      expectPrinted(gramsOfArea(1e6, row(key).areal ?? Number.NaN), gramsPerM2, 1);
    },
  );
});
