import { isInchUnit, otherUnit, QUANTITIES, type Quantity, type UnitOf } from '#shared/units/quantities.ts';
import { convert, UNITS, type Unit } from '#shared/units/units.ts';
import { formatInchFraction } from './inches.ts';
import {
  digitsOf,
  formatNumber,
  formatQuantity,
  NARROW_SPACE,
  NO_VALUE,
  unitLabel,
  type QuantityOptions,
  type Shown,
} from './numbers.ts';
import { FINE_EXTRA_DIGITS } from './precision.ts';

/** The unit of each quantity that a reader chose; one that is not named is shown as usual. */
export type ChosenUnits = { readonly [Q in Quantity]?: UnitOf<Q> | undefined };

export interface UnitsOptions extends QuantityOptions {
  /** the size of stock: in inches a fraction down to 1/64 where it is one */
  stock?: boolean | undefined;
  /** the area of one part, which the usual unit is too large for */
  small?: boolean | undefined;
}

export interface SizeOptions {
  /** leave the unit out */
  bare?: boolean | undefined;
  /** no fractions of an inch */
  decimal?: boolean | undefined;
  /** as many decimals as it takes to be read back as the same size */
  exact?: boolean | undefined;
}

/** How one reader sees quantities: every figure on screen, in print and in a file for that reader goes through it. */
export interface Units {
  unit: (quantity: Quantity) => Unit;
  /** the other system's unit, null where there is none */
  other: (quantity: Quantity) => Unit | null;
  /** sign for a table head: `g`, `kg/m³` */
  label: (quantity: Quantity, options?: Pick<UnitsOptions, 'unit' | 'small'>) => string;
  /** a value in the quantity's base unit */
  format: (value: Shown, quantity: Quantity, options?: UnitsOptions) => string;
  /** an uncertainty, which never prints as none (JCGM 100:2008, 7.2.6, lets it be rounded up) */
  doubt: (u: Shown, quantity: Quantity, options?: UnitsOptions) => string;
  /** a length in mm as short as it can be told: `1.5 mm`, `1/16 in`, `300 mm` */
  size: (lengthMm: Shown, options?: SizeOptions) => string;
  /** for spans and heights that are told in metres or feet */
  long: 'm' | 'ft';
  system: 'metric' | 'inch';
}

/** Quantities that go by another's choice. */
const FOLLOWS: Partial<Record<Quantity, Quantity>> = { classArea: 'area' };
const SMALL: Partial<Record<Unit, Unit>> = { dm2: 'cm2', m2: 'cm2', ft2: 'in2' };

/**
 * How a reader sees quantities who chose these units. A choice that the quantity does not offer counts as none.
 * @example unitsOf({ mass: 'oz' }).format(28.349523125, 'mass') // → '1.00\u202foz'
 */
export function unitsOf(chosen: ChosenUnits): Units {
  const unit = (quantity: Quantity): Unit => {
    const choice = chosen[quantity] ?? chosen[FOLLOWS[quantity] ?? quantity];
    const offered: readonly Unit[] = QUANTITIES[quantity].units;
    return choice !== undefined && offered.includes(choice) ? choice : QUANTITIES[quantity].shown;
  };
  const wanted = (quantity: Quantity, options: Pick<UnitsOptions, 'unit' | 'small'>): Unit => {
    const own = options.unit ?? unit(quantity);
    return options.small === true ? (SMALL[own] ?? own) : own;
  };
  const system = isInchUnit(unit('length')) ? 'inch' : 'metric';
  const format: Units['format'] = (value, quantity, options = {}) => {
    const own = wanted(quantity, options);
    const fraction = options.stock === true && own === 'in' ? stockSize(value, options) : null;
    return fraction ?? formatQuantity(value, quantity, { ...options, unit: own });
  };
  return {
    unit,
    other: (quantity) => otherUnit(quantity, unit(quantity)),
    label: (quantity, options = {}) => unitLabel(quantity, wanted(quantity, options)),
    format,
    doubt: (u, quantity, options = {}) => {
      const own = wanted(quantity, options);
      const digits = digitsOf(quantity, own) + (options.fine === true ? FINE_EXTRA_DIGITS : 0);
      const least = convert(10 ** -digits, own, QUANTITIES[quantity].base);
      return format(u && u > 0 ? Math.max(u, least) : u, quantity, options);
    },
    size: (lengthMm, options = {}) => {
      const own = unit('length');
      const fraction = own === 'in' && !options.decimal ? stockSize(lengthMm, options) : null;
      return fraction ?? shortest(lengthMm, own, options);
    },
    long: system === 'inch' ? 'ft' : 'm',
    system,
  };
}

/** Decimals of a size at most, by what can be measured at the bench. */
const SIZE_DIGITS: Partial<Record<Unit, number>> = { mm: 2, cm: 2, m: 3, in: 3, ft: 3 };
const EXACT_DIGITS: Partial<Record<Unit, number>> = { mm: 2, cm: 3, m: 5, in: 4, ft: 5 };

function shortest(lengthMm: Shown, unit: Unit, { bare, exact }: SizeOptions): string {
  if (lengthMm === null || lengthMm === undefined) return NO_VALUE;
  const text = formatNumber(
    convert(lengthMm, 'mm', unit as 'mm'),
    (exact === true ? EXACT_DIGITS : SIZE_DIGITS)[unit] ?? 2,
  );
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return bare === true || short === NO_VALUE ? short : `${short}${NARROW_SPACE}${UNITS[unit].label}`;
}

function stockSize(lengthMm: Shown, { bare }: UnitsOptions): string | null {
  const fraction = lengthMm === null || lengthMm === undefined ? null : formatInchFraction(lengthMm);
  if (fraction === null) return null;
  return bare === true ? fraction : `${fraction}${NARROW_SPACE}in`;
}

/** Millimetres and grams, as everybody sees them who chose nothing else. */
export const USUAL_UNITS: Units = unitsOf({});

/** Inches and ounces throughout. */
export const INCH_CHOICES: ChosenUnits = Object.fromEntries(
  (Object.keys(QUANTITIES) as Quantity[])
    .filter((quantity) => QUANTITIES[quantity].inch !== QUANTITIES[quantity].shown)
    .map((quantity) => [quantity, QUANTITIES[quantity].inch]),
);
