import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parseQuantity } from '#shared/units/parse.ts';
import type { ParseProblem } from '#shared/units/scan.ts';
import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { UNITS, type Unit } from '#shared/units/units.ts';

describe('what builders write', () => {
  const length: [string, number, Unit][] = [
    ['2.5', 2.5, 'mm'],
    ['2,5', 2.5, 'mm'],
    ['2,5 mm', 2.5, 'mm'],
    ['  12  ', 12, 'mm'],
    ['1 000', 1000, 'mm'],
    ['1\u202f000', 1000, 'mm'],
    ['.5', 0.5, 'mm'],
    ['7.', 7, 'mm'],
    ['+3', 3, 'mm'],
    ['-3', -3, 'mm'],
    ['\u22123', -3, 'mm'],
    ['\u20133', -3, 'mm'],
    ['\u2212 3,5', -3.5, 'mm'],
    ['1/16 in', 1.5875, 'in'],
    ['1/16"', 1.5875, 'in'],
    ['1/16″', 1.5875, 'in'],
    ['1 / 4 inch', 6.35, 'in'],
    ['3 1/2 in', 88.9, 'in'],
    ['3-1/2"', 88.9, 'in'],
    ['3½"', 88.9, 'in'],
    ['⅛ in', 3.175, 'in'],
    ['−3 1/2 in', -88.9, 'in'],
    ['31"', 787.4, 'in'],
    ['31 INCHES', 787.4, 'in'],
    ['12 cm', 120, 'cm'],
    ['1.2 m', 1200, 'm'],
    ["2'", 609.6, 'ft'],
    ['2 ft', 609.6, 'ft'],
    ['2\' 7"', 787.4, 'in'],
    ['2ft 7 1/2in', 800.1, 'in'],
    ["−2' 7½", -800.1, 'in'],
    ['1/2', 0.5, 'mm'],
  ];
  test.each(length)('“%s” in a length field is %d mm, typed in %s', (text, mm, unit) => {
    const parsed = parseQuantity(text, 'length');
    expect(parsed).toEqual({ value: expect.closeTo(mm, 10), unit });
  });

  const others: [string, Quantity, number, Unit][] = [
    ['0.4 oz', 'mass', 11.33980925, 'oz'],
    ['1 lb', 'mass', 453.59237, 'lb'],
    ['0,25kg', 'mass', 250, 'kg'],
    ['7 lb/ft3', 'density', 112.12924, 'lb/ft3'],
    ['7 lb/ft³', 'density', 112.12924, 'lb/ft3'],
    ['112', 'density', 112, 'kg/m3'],
    ['62 %', 'share', 0.62, 'percent'],
    ['62', 'share', 0.62, 'percent'],
    ['40 %', 'percentMac', 40, 'percent'],
    ['12.2', 'loading', 12.2, 'g/dm2'],
    ['4 oz/ft²', 'loading', 12.2060692, 'oz/ft2'],
    ['4°', 'angle', 4, 'deg'],
    ['2.3 g·mm', 'moment', 2.3, 'g.mm'],
    ['10.8 GPa', 'modulus', 10.8, 'GPa'],
    ['70 mpa', 'strength', 70, 'MPa'],
    ['12', 'count', 12, 'one'],
  ];
  test.each(others)('“%s” as %s is %d, typed in %s', (text, quantity, value, unit) => {
    expect(parseQuantity(text, quantity)).toEqual({ value: expect.closeTo(value, 5), unit });
  });

  test('a field in inches takes a bare number as inches, and a written unit all the same', () => {
    expect(parseQuantity('1/16', 'length', 'in')).toEqual({ value: 1.5875, unit: 'in' });
    expect(parseQuantity('2 mm', 'length', 'in')).toEqual({ value: 2, unit: 'mm' });
  });

  test('a share field in plain fractions takes 0.62 as it stands', () => {
    expect(parseQuantity('0,62', 'share', 'one')).toEqual({ value: 0.62, unit: 'one' });
  });
});

describe('small sums', () => {
  // Reckoned by hand; 1 in = 25.4 mm exactly (NIST SP 811).
  const sums: [string, number, Unit][] = [
    ['12+3.5', 15.5, 'mm'],
    ['12 − 3,5', 8.5, 'mm'],
    ['3*12.5', 37.5, 'mm'],
    ['3 × 12,5 mm', 37.5, 'mm'],
    ['3x4', 12, 'mm'],
    ['25 ÷ 2', 12.5, 'mm'],
    ['100/8/2', 6.25, 'mm'],
    ['1/2/4', 0.125, 'mm'],
    ['2 + 3*4', 14, 'mm'],
    ['(2 + 3)*4', 20, 'mm'],
    ['-(2 + 3)', -5, 'mm'],
    ['12 - -3', 15, 'mm'],
    ['12-31/2', -3.5, 'mm'],
    ['3 - 1/2', 2.5, 'mm'],
    ['1 000 + 1', 1001, 'mm'],
    ['1/2 in + 1/16 in', 14.2875, 'in'],
    ['2*1/16 in', 3.175, 'in'],
    ['(1/2 + 1/4) in', 19.05, 'in'],
    ['2 + 1/2 in', 14.7, 'in'],
    ['3\'6" + 1/2"', 1079.5, 'in'],
    ['2ft3in - 10 mm', 675.8, 'mm'],
    ['1 m - 2 cm', 980, 'mm'],
  ];
  test.each(sums)('“%s” is %d mm, told in %s', (text, mm, unit) => {
    expect(parseQuantity(text, 'length')).toEqual({ value: expect.closeTo(mm, 9), unit, sum: true });
  });

  test('a stroke divides, whatever the field’s unit: 31/2 is 15.5', () => {
    expect(parseQuantity('31/2', 'length')).toEqual({ value: 15.5, unit: 'mm' });
    expect(parseQuantity('31/2', 'length', 'in')).toEqual({ value: expect.closeTo(393.7, 9), unit: 'in' });
    expect(parseQuantity('3 1/2', 'length', 'in')).toEqual({ value: expect.closeTo(88.9, 9), unit: 'in' });
  });

  test('a number without a unit is in the field’s own unit, also beside one with a unit', () => {
    expect(parseQuantity('1 + 10 mm', 'length', 'in')).toMatchObject({ value: expect.closeTo(35.4, 9) });
  });

  test('masses and shares add up as lengths do', () => {
    expect(parseQuantity('0.4 oz + 2', 'mass')).toMatchObject({ value: expect.closeTo(13.33980925, 9) });
    expect(parseQuantity('50 % + 12', 'share')).toMatchObject({ value: expect.closeTo(0.62, 12) });
  });
});

describe('what cannot be taken', () => {
  const refused: [string, Quantity, ParseProblem][] = [
    ['', 'length', 'missing'],
    ['   ', 'mass', 'missing'],
    ['\u00a0', 'mass', 'missing'],
    ['abc', 'length', 'not_a_number'],
    ['mm', 'length', 'not_a_number'],
    ['-', 'length', 'not_a_number'],
    ['.', 'length', 'not_a_number'],
    ['--3', 'length', 'not_a_number'],
    ['1/', 'length', 'not_a_number'],
    ['1 2', 'length', 'not_a_number'],
    ['12 31/2', 'length', 'not_a_number'],
    ['12 +', 'length', 'not_a_number'],
    ['(12 + 3', 'length', 'not_a_number'],
    ['12) + 3', 'length', 'not_a_number'],
    ['(2 in) in', 'length', 'not_a_number'],
    ["2.5' 3", 'length', 'not_a_number'],
    ['NaN', 'length', 'not_a_number'],
    ['Infinity', 'length', 'not_a_number'],
    ['9'.repeat(400), 'length', 'not_a_number'],
    ['1,234.5', 'length', 'two_decimal_marks'],
    ['1.234.567', 'length', 'two_decimal_marks'],
    ['1/0', 'length', 'divided_by_zero'],
    ['3 1/0 in', 'length', 'divided_by_zero'],
    ['5 / (2 - 2)', 'length', 'divided_by_zero'],
    ['3 furlongs', 'length', 'unknown_unit'],
    ['1e5', 'length', 'unknown_unit'],
    ['3 g', 'length', 'wrong_unit'],
    ['3 mm', 'mass', 'wrong_unit'],
    ['2\' 7"', 'mass', 'wrong_unit'],
    ['3 %', 'density', 'wrong_unit'],
    ['3 mm + 2 g', 'length', 'wrong_unit'],
    ['3 mm * 2 mm', 'length', 'several_units'],
    ['3 / 2.5 mm', 'length', 'several_units'],
  ];
  test.each(refused)('“%s” in a %s field: %s', (text, quantity, problem) => {
    expect(parseQuantity(text, quantity)).toEqual({ problem });
  });

  test('an empty field is missing, never 0', () => {
    expect(parseQuantity('', 'mass')).not.toHaveProperty('value');
    expect(parseQuantity('0', 'mass')).toEqual({ value: 0, unit: 'g' });
  });

  test('a comma is a decimal mark even where three digits follow it', () => {
    expect(parseQuantity('1,234', 'length')).toEqual({ value: 1.234, unit: 'mm' });
  });

  test('a typed −0 is a plain 0', () => {
    const parsed = parseQuantity('-0', 'length');
    expect('value' in parsed && Object.is(parsed.value, 0)).toBe(true);
  });
});

test('whatever is typed, the answer is a finite value or a problem', () => {
  const quantity = fc.constantFrom(...(Object.keys(QUANTITIES) as Quantity[]));
  const keys = fc.string({
    unit: fc.constantFrom(...'0123456789.,/ -−½"\'mgicnoz%+*()x'.split('')),
    maxLength: 12,
  });
  fc.assert(
    fc.property(fc.oneof(fc.string(), keys), quantity, (text, measured) => {
      const parsed = parseQuantity(text, measured);
      if ('value' in parsed) expect(Number.isFinite(parsed.value)).toBe(true);
      else expect(parsed.problem).toMatch(/^[a-z_]+$/);
    }),
    { numRuns: 2000 },
  );
});

test('every unit’s own label, as the screen shows it, can be typed back', () => {
  for (const quantity of Object.keys(QUANTITIES) as Quantity[]) {
    for (const unit of QUANTITIES[quantity].units) {
      expect(parseQuantity(`3 ${UNITS[unit].label}`, quantity, unit), `${quantity} ${unit}`).toMatchObject({
        unit,
      });
    }
  }
});
