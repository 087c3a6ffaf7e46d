import { isNumberStart, readNumber, Refused, type Scanner } from './scan.ts';
import { readUnit } from './suffix.ts';
import { QUANTITIES, type Quantity } from './quantities.ts';
import { convert, type Unit } from './units.ts';

/** A value of the sum: in the quantity's base unit once it has a unit, a bare number until then. */
interface Value {
  value: number;
  bare: boolean;
}

/** What a sum is read for, and what is found on the way. */
export interface Reading {
  quantity: Quantity;
  /** unit of a bare number that stands beside one with a unit */
  fieldUnit: Unit;
  /** units that were written */
  units: Set<Unit>;
  /** whether anything had to be reckoned */
  reckoned: boolean;
}

/**
 * The sum that stands here: sum = product (`+` | `−` product)*. Bare numbers beside one with a unit are in the
 * field's own. What is found on the way is noted in `reading`.
 * @throws Refused for what is no sum, or whose units do not fit
 * @example readSum(new Scanner('1 + 2'), { quantity: 'length', fieldUnit: 'mm', units: new Set(), reckoned: false }) // → { value: 3, bare: true }
 */
export function readSum(scan: Scanner, reading: Reading): Value {
  let left = readProduct(scan, reading);
  for (;;) {
    const sign = scan.take(/\s*([+\-−–])\s*/y);
    if (!sign) return left;
    reading.reckoned = true;
    const right = readProduct(scan, reading);
    const factor = sign[1] === '+' ? 1 : -1;
    left =
      left.bare && right.bare
        ? { value: left.value + factor * right.value, bare: true }
        : { value: inBase(left, reading) + factor * inBase(right, reading), bare: false };
  }
}

/** product = factor (`×` | `÷` factor)*; what is multiplied or divided by has no unit. */
function readProduct(scan: Scanner, reading: Reading): Value {
  let left = readFactor(scan, reading, true);
  for (;;) {
    const sign = scan.take(/\s*([*×x/⁄÷])\s*/iy);
    if (!sign) return left;
    reading.reckoned = true;
    const divides = /[/⁄÷]/.test(sign[0]);
    // After a stroke no fraction begins: 1/2/4 is a half divided by 4.
    const right = readFactor(scan, reading, !divides);
    if (!right.bare && (divides || !left.bare)) throw new Refused('several_units');
    if (divides && right.value === 0) throw new Refused('divided_by_zero');
    left = {
      value: divides ? left.value / right.value : left.value * right.value,
      bare: left.bare && right.bare,
    };
  }
}

/** factor = sign? (number | `(` sum `)`) unit? */
function readFactor(scan: Scanner, reading: Reading, mayBeFraction: boolean): Value {
  const minus = /[-−–]/.test(scan.take(/[+\-−–]\s*/y)?.[0] ?? '');
  const inner = scan.take(/\(\s*/y) ? readBracket(scan, reading) : null;
  const { value, bare } = inner ?? { value: readNumber(scan, mayBeFraction), bare: true };
  const unit = readUnit(scan, reading.quantity);
  if (unit !== null && !bare) throw new Refused('not_a_number');
  const signed = minus ? -value : value;
  if (unit === null) return { value: signed, bare };
  const inches = unit === 'ft' && inner === null ? readInches(scan, value, reading.quantity) : null;
  reading.units.add(inches === null ? unit : 'in');
  const feet = inches === null ? 0 : (minus ? -1 : 1) * inches;
  return { value: fromUnit(signed, unit, reading.quantity) + feet, bare: false };
}

function readBracket(scan: Scanner, reading: Reading): Value {
  const inner = readSum(scan, reading);
  if (!scan.take(/\s*\)/y)) throw new Refused('not_a_number');
  return inner;
}

/** The inches of `2' 7 1/2"` in mm; null where nothing follows the feet. */
function readInches(scan: Scanner, feet: number, quantity: Quantity): number | null {
  if (!isNumberStart(scan)) return null;
  if (!Number.isInteger(feet)) throw new Refused('not_a_number');
  scan.take(/\s*/y);
  const inches = readNumber(scan, true);
  const unit = readUnit(scan, quantity) ?? 'in';
  if (unit !== 'in') throw new Refused('not_a_number');
  return fromUnit(inches, unit, quantity);
}

/**
 * What was read, in the quantity's base unit; a bare number is in the field's own.
 * @example inBase({ value: 2, bare: true }, { quantity: 'length', fieldUnit: 'cm', units: new Set(), reckoned: false }) // → 20
 */
export function inBase({ value, bare }: Value, { quantity, fieldUnit }: Reading): number {
  return bare ? fromUnit(value, fieldUnit, quantity) : value;
}

function fromUnit(value: number, unit: Unit, quantity: Quantity): number {
  return convert(value, unit, QUANTITIES[quantity].base);
}
