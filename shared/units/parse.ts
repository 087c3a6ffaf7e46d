import { QUANTITIES, type Quantity } from './quantities.ts';
import { Refused, Scanner, type ParseProblem } from './scan.ts';
import { inBase, readSum, type Reading } from './sum.ts';
import type { Unit } from './units.ts';

/**
 * The value in the quantity's base unit, and the unit it was typed in (the field's own where several were); or what
 * stands in the way. `sum` where it had to be reckoned.
 */
export type ParsedQuantity = { value: number; unit: Unit; sum?: true } | { problem: ParseProblem };

/** Longer texts are no number that anybody typed. */
const LONGEST = 200;
const VULGAR_FRACTION = /[¼-¾⅐-⅞]/g;

/**
 * Reads what was typed into a field, a number or a small sum. The rules:
 * - Comma or point is the decimal mark; there are no thousands marks, but a space may part thousands.
 * - An empty field is missing and not 0.
 * - A number without a unit is in the field's own unit. Feet take inches behind them: `2' 7 1/2"`.
 * - A stroke divides, so `1/16` is a fraction and `31/2` is 15.5. A whole number with a space or a hyphen before a
 *   proper fraction is a mixed one: `3 1/2`, `3-1/2`, `3½`; to subtract a fraction, put spaces round the minus.
 * - `+ − × * ÷ /` and brackets reckon, products first; only one factor has a unit.
 * @example parseQuantity('2 + 1/2 in', 'length') // → { value: 14.7, unit: 'in', sum: true }
 */
export function parseQuantity(
  text: string,
  quantity: Quantity,
  fieldUnit: Unit = QUANTITIES[quantity].shown,
): ParsedQuantity {
  const typed = text.replace(VULGAR_FRACTION, (mark) => ` ${mark.normalize('NFKD')}`).trim();
  if (typed === '') return { problem: 'missing' };
  if (typed.length > LONGEST) return { problem: 'not_a_number' };
  const reading: Reading = { quantity, fieldUnit, units: new Set(), reckoned: false };
  try {
    const scan = new Scanner(typed);
    const value = inBase(readSum(scan, reading), reading);
    if (!scan.ended || !Number.isFinite(value)) return { problem: 'not_a_number' };
    const [unit = fieldUnit, another] = reading.units;
    return {
      // A typed −0 is 0.
      value: value === 0 ? 0 : value,
      unit: another === undefined ? unit : fieldUnit,
      ...(reading.reckoned && { sum: true as const }),
    };
  } catch (refused) {
    if (refused instanceof Refused) return { problem: refused.problem };
    throw refused;
  }
}
