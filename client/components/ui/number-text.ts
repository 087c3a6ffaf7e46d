import { formatInchFraction } from '#shared/format/inches.ts';
import { formatQuantity, MINUS, roundTo, unitLabel } from '#shared/format/numbers.ts';
import { parseQuantity, type ParseProblem } from '#shared/units/parse.ts';
import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { convert, type Unit } from '#shared/units/units.ts';

/** Decimals that a field shows at most; trailing zeros are left out. */
const FIELD_DIGITS = 6;
/** An inch fraction within this of the value, mm, is that fraction and no coincidence of rounding. */
const SAME_MM = 1e-6;

/** Text with which a field shows a value (in the quantity's base unit) that was not typed into it. */
export function textOf(value: number | null | undefined, quantity: Quantity, unit: Unit): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '';
  const fraction = quantity === 'length' && unit === 'mm' ? stockFraction(value) : null;
  if (fraction !== null) return `${fraction} in`;
  return plain(convert(value, QUANTITIES[quantity].base, unit));
}

function plain(value: number): string {
  return String(roundTo(value, FIELD_DIGITS)).replace('-', MINUS);
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

/** What stands behind the field: the unit, or what the typed text is in the other unit. */
export function besideOf(text: string, quantity: Quantity, unit: Unit): string {
  const read = parseQuantity(text, quantity, unit);
  const label = unitLabel(quantity, unit);
  if (!('value' in read)) return label;
  if (read.unit !== unit) return formatQuantity(read.value, quantity, { unit, fine: true });
  const fraction =
    quantity === 'length' && unit === 'mm' && read.value !== 0 ? exactFraction(read.value) : null;
  return fraction === null ? label : `${label} · ${fraction} in`;
}

/** One press of an arrow key, in the unit named. */
const STEPS: Partial<Record<Unit, number>> = {
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
  return ownUnit ? `${plain(next)} ${unitLabel(quantity, read.unit)}` : plain(next);
}

const PROBLEMS: Record<ParseProblem, string> = {
  missing: 'Type a number.',
  not_a_number: 'Not a number. Write 12.5, 1/16 or 3 1/2 in.',
  two_decimal_marks: 'Use one decimal mark and no thousands marks.',
  divided_by_zero: 'A fraction cannot be over 0.',
  unknown_unit: 'That unit is not known.',
  wrong_unit: 'That unit measures something else.',
};

export function problemText(problem: ParseProblem): string {
  return PROBLEMS[problem];
}

interface Range {
  quantity: Quantity;
  unit: Unit;
  min?: number | undefined;
  max?: number | undefined;
  /** the bound itself is refused too */
  above?: number | undefined;
}

/** What is wrong with the size of a value, all in the base unit; undefined when nothing is. */
export function rangeText(value: number, { quantity, unit, min, max, above }: Range): string | undefined {
  const shown = (bound: number) => `${textOf(bound, quantity, unit)} ${unitLabel(quantity, unit)}`.trim();
  if (above !== undefined && value <= above) return `Must be more than ${shown(above)}.`;
  if (min !== undefined && value < min) return `Must be at least ${shown(min)}.`;
  if (max !== undefined && value > max) return `Must be at most ${shown(max)}.`;
  return undefined;
}
