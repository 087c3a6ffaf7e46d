import { Decimal } from 'decimal.js';
import { Exact, limitValue, type Limit } from './limit.ts';

/** A measured figure as it was read, with its standard uncertainty in the same unit. */
export interface Measured {
  /** decimal text: g, dm² or mm */
  value: string;
  u: number;
}

/** What was measured of a model for one limit. */
export type MeasuredFor =
  | { quantity: 'mass' | 'area' | 'span' | 'nose_radius'; value: Measured }
  | { quantity: 'loading'; mass: Measured; area: Measured };

/** A limit and what was measured against it. */
export interface Verdict {
  verdict: 'inside' | 'outside' | 'too_close';
  /** how far inside, below 0 outside: exact decimal text in g, dm² or mm; of a loading in g at the measured area */
  margin: string;
  /** half width of the guard band in the same unit */
  guard: string;
  /** what to add (a least value) or take off (a greatest one), g, in whole steps of the scale; null where it is inside or no matter of mass */
  grams: string | null;
}

/**
 * Whether a measured figure keeps a limit, exactly: nothing is rounded before it is compared, and a loading is
 * compared as mass against limit × area, so that no quotient is taken. With a guard band of `k` standard
 * uncertainties a figure nearer to the limit than that is too close for the instrument (guarded acceptance, JCGM
 * 106:2012, 8.3); `k` 0 compares as it is. `step` is the scale's, g.
 * @example judge({ quantity: 'mass', bound: 'min', value: '410', unit: 'g', inclusive: true }, { quantity: 'mass', value: { value: '409.9', u: 0 } }, { k: 0, step: '0.1' }) // → { verdict: 'outside', margin: '-0.1', guard: '0', grams: '0.1' }
 */
export function judge(
  limit: Pick<Limit, 'quantity' | 'bound' | 'value' | 'unit' | 'inclusive'>,
  measured: MeasuredFor,
  { k, step }: { k: number; step: string },
): Verdict {
  const { difference, u } = differenceOf(limit, measured);
  const margin = limit.bound === 'min' ? difference : difference.neg();
  const guard = new Exact(k).times(u);
  const isClose = guard.gt(0) && margin.abs().lt(guard);
  const isInside = margin.gt(0) || (margin.isZero() && limit.inclusive);
  const verdict = isClose ? 'too_close' : isInside ? 'inside' : 'outside';
  const ofMass = measured.quantity === 'mass' || measured.quantity === 'loading';
  return {
    verdict,
    margin: margin.toFixed(),
    guard: guard.toFixed(),
    grams:
      verdict === 'inside' || !ofMass
        ? null
        : toStep(guard.minus(margin), step, limit.inclusive || guard.gt(0)),
  };
}

/** Measured less limit in g, dm² or mm, with its standard uncertainty. */
function differenceOf(
  limit: Pick<Limit, 'value' | 'unit'>,
  measured: MeasuredFor,
): { difference: Decimal; u: number } {
  const { times, over } = limitValue(limit);
  if (measured.quantity !== 'loading') {
    const { value, u } = measured.value;
    return { difference: new Exact(value).minus(times.div(over)), u };
  }
  const { mass, area } = measured;
  // m − L·A, all times the unit's divisor and divided by it last: exact wherever the quotient is.
  const difference = new Exact(mass.value).times(over).minus(times.times(area.value)).div(over);
  const limitPerArea = times.div(over).toNumber();
  return { difference, u: Math.hypot(mass.u, limitPerArea * area.u) };
}

/** The least whole number of steps that is at least (or, where the limit itself is not allowed, more than) so many g. */
function toStep(grams: Decimal, step: string, enough: boolean): string {
  const unit = new Exact(step);
  const steps = grams.div(unit);
  const whole = enough ? steps.ceil() : steps.floor().plus(1);
  return Decimal.max(whole, 0).times(unit).toFixed();
}
