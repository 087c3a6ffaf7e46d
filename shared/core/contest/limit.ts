import { Decimal } from 'decimal.js';

/** What a class may limit. */
export type LimitQuantity = 'mass' | 'loading' | 'area' | 'span' | 'nose_radius';

/** Units that a rule may be written in. */
export type LimitUnit =
  'g' | 'kg' | 'oz' | 'lb' | 'g/dm2' | 'oz/ft2' | 'dm2' | 'in2' | 'mm' | 'cm' | 'm' | 'in';

/** Which area a limit means: all of them lie on the horizontal, each surface at zero incidence. */
export type AreaBasis = 'wing' | 'wing_and_tail';

/**
 * Which mass a limit means: `extreme` takes the lightest set-up for a least value and the heaviest for a greatest
 * one, as flown; `without_battery` leaves the battery out.
 */
export type MassBasis = 'extreme' | 'without_battery';

/** One limit of a class as its rule words it. */
export interface Limit {
  quantity: LimitQuantity;
  bound: 'min' | 'max';
  /** as printed, so that it is compared exactly */
  value: string;
  unit: LimitUnit;
  /** whether the value itself is allowed: “12 to 75” is, “less than 75” is not */
  inclusive: boolean;
  areaBasis: AreaBasis;
  massBasis: MassBasis;
}

/** How many g, g/dm², dm² or mm a unit is: an exact quotient (NIST SP 811, 2008, appendix B). */
const FACTORS: Record<LimitUnit, { times: string; over: string }> = {
  g: { times: '1', over: '1' },
  kg: { times: '1000', over: '1' },
  oz: { times: '28.349523125', over: '1' },
  lb: { times: '453.59237', over: '1' },
  'g/dm2': { times: '1', over: '1' },
  'oz/ft2': { times: '28.349523125', over: '9.290304' },
  dm2: { times: '1', over: '1' },
  in2: { times: '0.064516', over: '1' },
  mm: { times: '1', over: '1' },
  cm: { times: '10', over: '1' },
  m: { times: '1000', over: '1' },
  in: { times: '25.4', over: '1' },
};

/**
 * Decimals with enough digits for every product of what can be typed.
 * @example new Exact('0.1').plus('0.2').toFixed() // → '0.3'
 */
export const Exact = Decimal.clone({ precision: 80 });

/**
 * A limit's value in g, g/dm², dm² or mm, as an exact quotient.
 * @example String(limitValue({ value: '0.55', unit: 'lb' }).times) // → '249.4758035'
 */
export function limitValue({ value, unit }: Pick<Limit, 'value' | 'unit'>): {
  times: Decimal;
  over: Decimal;
} {
  const { times, over } = FACTORS[unit];
  return { times: new Exact(value).times(times), over: new Exact(over) };
}
