import { convert } from '#shared/units/units.ts';

/** Finest division that stock is sold in. */
const DIVISIONS = 64;
/** Half of 0.01 mm, in inches: a size in mm rounded to 0.01 is still known by its fraction, 1.6 mm is not 1/16 in. */
const TOLERANCE_IN = 2e-4;

/**
 * A length in mm as builders name stock, `1/16`, `3 1/2`, `31`; null where it is no fraction down to 1/64 in.
 * The unit is left to the caller: `1/16 in`, `31"`.
 * @example formatInchFraction(88.9) // → '3 1/2'
 */
export function formatInchFraction(lengthMm: number): string | null {
  const inches = convert(Math.abs(lengthMm), 'mm', 'in');
  const parts = Math.round(inches * DIVISIONS);
  if (!Number.isFinite(inches) || Math.abs(inches - parts / DIVISIONS) > TOLERANCE_IN) return null;
  const whole = Math.floor(parts / DIVISIONS);
  let numerator = parts % DIVISIONS;
  let denominator = DIVISIONS;
  while (numerator > 0 && numerator % 2 === 0) {
    numerator /= 2;
    denominator /= 2;
  }
  const fraction = numerator === 0 ? '' : `${numerator}/${denominator}`;
  const text = whole === 0 && fraction !== '' ? fraction : `${whole} ${fraction}`.trim();
  return lengthMm < 0 && parts > 0 ? `\u2212${text}` : text;
}
