import { formatInchFraction } from '#shared/format/inches.ts';
import { formatQuantity, MINUS, NARROW_SPACE, roundTo, unitLabel } from '#shared/format/numbers.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { otherUnit, QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { convert, type Unit } from '#shared/units/units.ts';

/** Decimals that a field shows at most, trailing zeros left out: in each unit as fine as can be measured. */
const FIELD_DIGITS: Partial<Record<Unit, number>> = { in: 3, ft: 4, oz: 3, lb: 4 };
const USUAL_DIGITS = 6;
/** An inch fraction within this of the value, mm, is that fraction and no coincidence of rounding. */
const SAME_MM = 1e-6;

/** Text with which a field shows a value (in the quantity's base unit) that was not typed into it. */
export function textOf(value: number | null | undefined, quantity: Quantity, unit: Unit): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '';
  if (quantity === 'length') {
    const fraction = unit === 'mm' ? stockFraction(value) : unit === 'in' ? exactFraction(value) : null;
    if (fraction !== null) return unit === 'in' ? fraction : `${fraction} in`;
  }
  return plain(convert(value, QUANTITIES[quantity].base, unit), unit);
}

function plain(value: number, unit: Unit): string {
  return String(roundTo(value, FIELD_DIGITS[unit] ?? USUAL_DIGITS)).replace('-', MINUS);
}

/** `1/16` for 1.5875 mm: sizes that only make sense in inches. Whole tenths of a mm stay metric. */
function stockFraction(lengthMm: number): string | null {
  if (Math.abs(roundTo(lengthMm, 1) - lengthMm) < SAME_MM) return null;
  return exactFraction(lengthMm);
}

function exactFraction(lengthMm: number): string | null {
  const fraction = formatInchFraction(lengthMm);
  if (fraction === null) return null;
  const read = parseQuantity(fraction, 'length', 'in');
  return 'value' in read && Math.abs(read.value - lengthMm) < SAME_MM ? fraction : null;
}

/**
 * What stands behind the field: its unit and the same in the other system; where another unit or a sum was typed,
 * what that comes to in the field's own.
 */
export function besideOf(text: string, quantity: Quantity, unit: Unit): string {
  const read = parseQuantity(text, quantity, unit);
  const label = unitLabel(quantity, unit);
  if (!('value' in read)) return label;
  if (read.sum || read.unit !== unit) return `= ${inUnit(read.value, quantity, unit)}`;
  const other = otherUnit(quantity, unit);
  if (other === null || read.value === 0) return label;
  return `${label} · ${inUnit(read.value, quantity, other)}`;
}

/** The same where a heading names the unit: only what another unit or a sum comes to; empty where neither was typed. */
export function underneathOf(text: string, quantity: Quantity, unit: Unit): string {
  const read = parseQuantity(text, quantity, unit);
  if (!('value' in read) || (!read.sum && read.unit === unit)) return '';
  return `= ${inUnit(read.value, quantity, unit, true)}`;
}

function inUnit(value: number, quantity: Quantity, unit: Unit, bare = false): string {
  const fraction = quantity === 'length' && unit === 'in' ? exactFraction(value) : null;
  if (fraction !== null) return bare ? fraction : `${fraction}${NARROW_SPACE}in`;
  return formatQuantity(value, quantity, { unit, bare, fine: Math.abs(value) < FINE_BELOW });
}

/** Small sizes and masses are told with one more decimal, mm or g. */
const FINE_BELOW = 10;

/** One press of an arrow key, in the unit named. */
const STEPS: Partial<Record<Unit, number>> = {
  mm: 0.5,
  in: 1 / 16,
  m: 0.01,
  cm: 0.1,
  g: 0.1,
  oz: 0.01,
  kg: 0.001,
  one: 0.1,
  deg: 0.5,
  GPa: 0.1,
  'g/cm3': 0.01,
  'lb/ft3': 0.1,
  'oz/ft2': 0.1,
  ft: 1 / 12,
  lb: 0.01,
};

/**
 * The text after `steps` presses of an arrow key (negative: down), in the unit that was typed; the text itself
 * where it holds no number.
 */
export function stepped(text: string, quantity: Quantity, unit: Unit, steps: number, step?: number): string {
  const read = parseQuantity(text, quantity, unit);
  if (!('value' in read)) return text;
  const one = step ?? (quantity === 'count' ? 1 : (STEPS[read.unit] ?? 1));
  const next = convert(read.value, QUANTITIES[quantity].base, read.unit) + steps * one;
  const ownUnit = read.unit !== unit;
  if (read.unit === 'in') {
    const fraction = formatInchFraction(convert(next, 'in', 'mm'));
    if (fraction !== null) return ownUnit ? `${fraction} in` : fraction;
  }
  const number = plain(next, read.unit);
  return ownUnit ? `${number} ${unitLabel(quantity, read.unit)}` : number;
}
