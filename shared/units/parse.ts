import { QUANTITIES, type Quantity } from './quantities.ts';
import { SPELLINGS } from './spellings.ts';
import { convert, type Unit } from './units.ts';

export type ParseProblem =
  'missing' | 'not_a_number' | 'two_decimal_marks' | 'divided_by_zero' | 'unknown_unit' | 'wrong_unit';

/** The value in the quantity's base unit, and the unit it was typed in; or what stands in the way. */
export type ParsedQuantity = { value: number; unit: Unit } | { problem: ParseProblem };

/**
 * Reads what was typed into a field. One rule: comma or point is the decimal mark, there are no thousands marks,
 * spaces are ignored (but part a whole number from its fraction), an empty field is missing and not 0. `1/16`,
 * `3 1/2`, `3-1/2`, `3½`, a true minus and a unit behind the number are understood; so are feet with inches
 * (`2' 7 1/2"`). Without a unit the field's own unit holds.
 */
export function parseQuantity(
  text: string,
  quantity: Quantity,
  fieldUnit: Unit = QUANTITIES[quantity].shown,
): ParsedQuantity {
  const typed = text.replace(VULGAR_FRACTION, (mark) => ` ${mark.normalize('NFKD')}`).trim();
  if (typed === '') return { problem: 'missing' };
  const feetAndInches = FEET_AND_INCHES.exec(typed);
  if (feetAndInches) return parseFeetAndInches(feetAndInches, quantity);
  const [, sign = '', digits = '', suffix = ''] = SIGN_NUMBER_UNIT.exec(typed) ?? [];
  const number = parseNumber(digits.trim());
  if (typeof number === 'string') return { problem: number };
  const unit = suffix.trim() === '' ? fieldUnit : unitOfSuffix(suffix, quantity);
  if (unit === undefined) return { problem: 'unknown_unit' };
  return inBase(sign === '' || sign === '+' ? number : -number, unit, quantity);
}

const VULGAR_FRACTION = /[¼-¾⅐-⅞]/g;
const SIGN_NUMBER_UNIT = /^([+\-−–]?)([\d.,\s/⁄-]*)(.*)$/s;
const FEET_AND_INCHES = /^([+\-−–]?)\s*(\d+)\s*(?:'|′|ft)\s*([\d.,\s/⁄-]*\d)\s*(?:"|″|''|in)?$/i;
const DECIMAL = /^(\d+[.,]?\d*|[.,]\d+)$/;
const MIXED_FRACTION = /^(?:(\d+)[\s-]+)?(\d+)\s*[/⁄]\s*(\d+)$/;

/** A number without sign or unit, or its problem. */
function parseNumber(digits: string): number | ParseProblem {
  const [, whole = '0', numerator = '', denominator = ''] = MIXED_FRACTION.exec(digits) ?? [];
  if (denominator !== '') {
    if (Number(denominator) === 0) return 'divided_by_zero';
    return finite(Number(whole) + Number(numerator) / Number(denominator));
  }
  const bare = digits.replace(/\s/g, '');
  if (/^[\d.,]+$/.test(bare) && bare.replace(/\d/g, '').length > 1) return 'two_decimal_marks';
  return DECIMAL.test(bare) ? finite(Number(bare.replace(',', '.'))) : 'not_a_number';
}

const finite = (value: number): number | ParseProblem => (Number.isFinite(value) ? value : 'not_a_number');

function parseFeetAndInches(match: RegExpExecArray, quantity: Quantity): ParsedQuantity {
  const [, sign = '', feet = '', rest = ''] = match;
  const inches = parseNumber(rest.trim());
  if (typeof inches === 'string') return { problem: inches };
  const total = Number(feet) * 12 + inches;
  return inBase(sign === '' || sign === '+' ? total : -total, 'in', quantity);
}

/** `"`, `in` or `lb/ft³` as the unit meant; a spelling that serves two units means the one this quantity has. */
function unitOfSuffix(suffix: string, quantity: Quantity): Unit | undefined {
  const spelling = suffix
    .replace(/\s/g, '')
    .replaceAll('²', '2')
    .replaceAll('³', '3')
    .replaceAll('·', '.')
    .toLowerCase();
  const candidates = SPELLINGS.get(spelling) ?? [];
  const offered: readonly Unit[] = QUANTITIES[quantity].units;
  return candidates.find((unit) => offered.includes(unit)) ?? candidates[0];
}

function inBase(value: number, unit: Unit, quantity: Quantity): ParsedQuantity {
  const { base, units } = QUANTITIES[quantity];
  const offered: readonly Unit[] = units;
  if (!offered.includes(unit)) return { problem: 'wrong_unit' };
  const inBaseUnit = convert(value, unit, base);
  if (!Number.isFinite(inBaseUnit)) return { problem: 'not_a_number' };
  // A typed −0 is 0.
  return { value: inBaseUnit === 0 ? 0 : inBaseUnit, unit };
}
