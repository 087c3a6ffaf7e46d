import { Decimal } from 'decimal.js';
import { apportion } from './apportion.ts';

/** Masses are shared out to so many digits of the whole. */
const DIGITS = 12;
/** Measures that came from inches do not add up to the last digit; so much is nothing, mm. */
const NOTHING = 1e-6;

export interface Cuts {
  /** the measure that is divided, mm */
  whole: number;
  /** of the pieces wanted, in that measure, mm */
  wanted: readonly number[];
  /** what one cut takes away, mm */
  kerf: number;
}

const sumOf = (values: readonly Decimal.Value[]) => Decimal.sum(0, ...values);

/**
 * Divides a measure by cuts. Behind the last piece there is one more cut, and what lies behind it is left over, unless
 * that cut runs off the end.
 * @returns the measures of the pieces wanted and, last, of what is left; or by how much the whole is too short, mm
 * @example divideMeasure({ whole: 100, wanted: [30, 30], kerf: 1 }) // → { pieces: [30, 30, 38] }
 */
export function divideMeasure({ whole, wanted, kerf }: Cuts): { pieces: number[] } | { missing: number } {
  const between = new Decimal(kerf).times(Math.max(wanted.length - 1, 0));
  const left = new Decimal(whole).minus(sumOf(wanted)).minus(between);
  if (left.lt(-NOTHING)) return { missing: left.negated().toNumber() };
  const rest = left.minus(kerf);
  return { pieces: rest.gt(NOTHING) ? [...wanted, rest.toNumber()] : [...wanted] };
}

/**
 * Shares the mass of a whole out by volume; what no piece got is lost. Pieces and loss add up to the whole to the last
 * digit.
 * @param mass g; null where the whole was not weighed
 * @param volumes of the pieces, in any measure that `whole` is in too
 * @returns g; null for a piece too small to weigh anything in twelve digits of the whole
 * @example shareMass(10, [300, 600], 1000) // → { masses: [3, 6], lost: 1 }
 */
export function shareMass(
  mass: number | null,
  volumes: readonly number[],
  whole: number,
): { masses: (number | null)[]; lost: number | null } {
  if (mass === null) return { masses: volumes.map(() => null), lost: null };
  const total = new Decimal(mass);
  const taken = sumOf(volumes);
  const all = Decimal.max(whole, taken);
  const figures = [...volumes, all.minus(taken)].map((volume) => total.times(volume).dividedBy(all));
  const digits = Math.max(DIGITS - 1 - total.e, total.decimalPlaces());
  const shared = apportion(figures, total, digits).map((one) => one.toNumber());
  return { masses: shared.slice(0, -1).map((one) => (one > 0 ? one : null)), lost: shared.at(-1) ?? 0 };
}
