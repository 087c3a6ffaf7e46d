import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { convert, UNITS, type Unit } from '#shared/units/units.ts';
import { DIGITS, FINE_EXTRA_DIGITS } from './precision.ts';

/** U+2212, as wide as a plus. */
export const MINUS = '\u2212';
/** U+202F, for thousands and before a unit. */
export const NARROW_SPACE = '\u202f';
/** What stands where there is no value. */
export const NO_VALUE = '\u2013';

/** How a number is written. */
export interface NumberOptions {
  decimalMark?: '.' | ',' | undefined;
  /** write the plus of a positive difference */
  plus?: boolean | undefined;
}

/** How a quantity is written. */
export interface QuantityOptions extends NumberOptions {
  /** unit to show; the quantity's own metric one by default */
  unit?: Unit | undefined;
  /** leave the unit out, for a table column that names it in its head */
  bare?: boolean | undefined;
  /** one more decimal, for small masses and fine work */
  fine?: boolean | undefined;
}

/** What may have to be shown; null and undefined for what is not there. */
export type Shown = number | null | undefined;

/**
 * A number with a fixed count of decimals (negative: rounded to tens, hundreds …), halves away from zero, true
 * minus, narrow spaces between thousands, never −0; an en dash for what is not there, NaN and Infinity.
 * @example formatNumber(-1234.56, 1) // → '\u22121\u202f234.6'
 */
export function formatNumber(value: Shown, digits: number, options: NumberOptions = {}): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NO_VALUE;
  const rounded = roundTo(value, digits);
  const [whole = '', decimals] = Math.abs(rounded).toFixed(Math.max(0, digits)).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, NARROW_SPACE);
  const text = decimals === undefined ? grouped : `${grouped}${options.decimalMark ?? '.'}${decimals}`;
  if (rounded < 0) return `${MINUS}${text}`;
  return options.plus === true && rounded > 0 ? `+${text}` : text;
}

/**
 * A value in the quantity's base unit as text with its unit, in the decimals of the one precision table; an en dash
 * for what is not there.
 * @throws RangeError when the unit does not belong to the quantity
 * @example formatQuantity(220.04, 'mass') // → '220.0\u202fg'
 */
export function formatQuantity(value: Shown, quantity: Quantity, options: QuantityOptions = {}): string {
  const unit = options.unit ?? QUANTITIES[quantity].shown;
  const digits = digitsOf(quantity, unit) + (options.fine === true ? FINE_EXTRA_DIGITS : 0);
  if (value === null || value === undefined || !Number.isFinite(value)) return NO_VALUE;
  const number = formatNumber(convert(value, QUANTITIES[quantity].base, unit), digits, options);
  const { label } = UNITS[unit];
  if (options.bare === true || label === '') return number;
  return label === '°' ? `${number}${label}` : `${number}${NARROW_SPACE}${label}`;
}

/**
 * Decimals that a quantity is shown with in a unit.
 * @throws RangeError when the unit does not belong to the quantity
 * @example digitsOf('mass', 'oz') // → 2
 */
export function digitsOf(quantity: Quantity, unit: Unit): number {
  const digits = (DIGITS[quantity] as Partial<Record<Unit, number>>)[unit];
  if (digits === undefined) throw new RangeError(`${quantity} is not measured in ${unit}.`);
  return digits;
}

/**
 * Sign of the unit for a table head or behind a field: `g`, `kg/m³`, `°`; empty for plain numbers.
 * @example unitLabel('density') // → 'kg/m³'
 */
export function unitLabel(quantity: Quantity, unit: Unit = QUANTITIES[quantity].shown): string {
  return UNITS[unit].label;
}

/**
 * Rounded in decimal, halves away from zero: 1.005 with two digits is 1.01, although the nearest double lies below.
 * A negative count of digits rounds to tens, hundreds …
 * @example roundTo(1.005, 2) // → 1.01
 */
export function roundTo(value: number, digits: number): number {
  const [mantissa = '0', exponent = '0'] = String(Math.abs(value)).split('e');
  const shifted = Math.round(Number(`${mantissa}e${Number(exponent) + digits}`));
  const [whole = '0', power = '0'] = String(shifted).split('e');
  const magnitude = Number(`${whole}e${Number(power) - digits}`);
  return value < 0 && magnitude > 0 ? -magnitude : magnitude;
}
