import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { formatInchFraction } from '#shared/format/inches.ts';
import { digitsOf, formatNumber, formatQuantity, roundTo, unitLabel } from '#shared/format/numbers.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';

const nnbsp = '\u202f';
const minus = '\u2212';
const dash = '\u2013';

describe('formatNumber', () => {
  test.each([
    [4566, 0, `4${nnbsp}566`],
    [1234567.891, 2, `1${nnbsp}234${nnbsp}567.89`],
    [999.96, 1, `1${nnbsp}000.0`],
    [-5578, 0, `${minus}5${nnbsp}578`],
    [0.15, 1, '0.2'],
    [1.005, 2, '1.01'],
    [-2.5, 0, `${minus}3`],
    [82_151, -3, `82${nnbsp}000`],
    [499, -3, '0'],
    [5e-7, 1, '0.0'],
  ])('%d with %d digits is “%s”', (value, digits, text) => {
    expect(formatNumber(value, digits)).toBe(text);
  });

  test('what rounds to nothing loses its minus', () => {
    expect(formatNumber(-0.04, 1)).toBe('0.0');
    expect(formatNumber(-0, 1)).toBe('0.0');
    expect(formatNumber(-0.04, 1, { plus: true })).toBe('0.0');
  });

  test.each([[null], [undefined], [Number.NaN], [Number.POSITIVE_INFINITY]])('%s is an en dash', (value) => {
    expect(formatNumber(value, 1)).toBe(dash);
    expect(formatQuantity(value, 'mass')).toBe(dash);
  });

  test('a difference may carry its plus, and the decimal mark is the caller’s', () => {
    expect(formatNumber(1.84, 1, { plus: true })).toBe('+1.8');
    expect(formatNumber(1234.5, 1, { decimalMark: ',' })).toBe(`1${nnbsp}234,5`);
  });
});

describe('formatQuantity', () => {
  test.each<[number, Quantity, string]>([
    [220.04, 'mass', `220.0${nnbsp}g`],
    [-168, 'length', `${minus}168.0${nnbsp}mm`],
    [53.94, 'percentMac', `53.9${nnbsp}%`],
    [12.22, 'loading', `12.2${nnbsp}g/dm²`],
    [-2562.4, 'moment', `${minus}2${nnbsp}562${nnbsp}g·mm`],
    [112.4, 'density', `112${nnbsp}kg/m³`],
    [4.36, 'speed', `4.4${nnbsp}m/s`],
    [36_512, 'reynolds', `37${nnbsp}000`],
    [0.0957, 'fineShare', `9.6${nnbsp}%`],
    [0.34, 'share', `34${nnbsp}%`],
    [4, 'angle', '4.0°'],
    [177_000, 'area', `17.70${nnbsp}dm²`],
    [2.24, 'modulus', `2.24${nnbsp}GPa`],
  ])('%d as %s is “%s”', (value, quantity, text) => {
    expect(formatQuantity(value, quantity)).toBe(text);
  });

  test('shows another unit, a finer mass, or no unit where the column names it', () => {
    expect(formatQuantity(12.2, 'loading', { unit: 'oz/ft2' })).toBe(`4.0${nnbsp}oz/ft²`);
    expect(formatQuantity(0.173134, 'mass', { fine: true })).toBe(`0.17${nnbsp}g`);
    expect(formatQuantity(25.4, 'length', { unit: 'in', bare: true })).toBe('1.000');
  });

  test('refuses a unit that the quantity is not measured in', () => {
    expect(() => formatQuantity(1, 'mass', { unit: 'mm' })).toThrow(RangeError);
    expect(() => digitsOf('mass', 'deg')).toThrow(RangeError);
  });

  test('labels stand alone for table heads', () => {
    expect(unitLabel('density')).toBe('kg/m³');
    expect(unitLabel('density', 'lb/ft3')).toBe('lb/ft³');
    expect(unitLabel('reynolds')).toBe('');
  });

  test('what is shown can be typed back, within half of the last digit shown', () => {
    const quantity = fc.constantFrom(...(Object.keys(QUANTITIES) as Quantity[]));
    fc.assert(
      fc.property(quantity, fc.double({ min: -20_000, max: 20_000, noNaN: true }), (measured, value) => {
        const parsed = parseQuantity(formatQuantity(value, measured), measured);
        expect('value' in parsed, JSON.stringify(parsed)).toBe(true);
        const step = 10 ** -digitsOf(measured, QUANTITIES[measured].shown);
        const shown = parseQuantity(String(step), measured);
        const half = 'value' in shown ? shown.value / 2 : 0;
        if ('value' in parsed) expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(half * (1 + 1e-9));
      }),
    );
  });
});

test('roundTo rounds the written decimal, so that a printed column adds up as it reads', () => {
  expect(roundTo(0.15, 1)).toBe(0.2);
  expect(roundTo(-0.15, 1)).toBe(-0.2);
  expect(roundTo(1e-9, 2)).toBe(0);
  expect(Object.is(roundTo(-1e-9, 2), 0)).toBe(true);
  expect(roundTo(1.5e21, 1)).toBe(1.5e21);
});

describe('formatInchFraction', () => {
  test.each([
    [1.5875, '1/16'],
    [1.59, '1/16'],
    [88.9, '3 1/2'],
    [787.4, '31'],
    [0.396875, '1/64'],
    [2.38125, '3/32'],
    [-6.35, `${minus}1/4`],
    [0, '0'],
  ])('%d mm is %s in', (mm, text) => {
    expect(formatInchFraction(mm)).toBe(text);
  });

  test.each([[1.6], [2], [100], [Number.NaN]])('%d mm is no fraction of an inch', (mm) => {
    expect(formatInchFraction(mm)).toBeNull();
  });

  test('every 1/64 in up to 2 in reads back as itself', () => {
    for (let n = 1; n <= 128; n += 1) {
      const text = formatInchFraction((n * 25.4) / 64) ?? '';
      expect(parseQuantity(`${text} in`, 'length')).toEqual({
        value: expect.closeTo((n * 25.4) / 64, 9),
        unit: 'in',
      });
    }
  });
});
