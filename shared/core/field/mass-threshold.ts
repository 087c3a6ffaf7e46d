import { judge } from '../contest/verdict.ts';

/** A mass from or over which a country's rules ask for more. */
export interface MassThreshold {
  /** decimal text, as printed */
  value: string;
  unit: 'g' | 'kg' | 'oz' | 'lb';
  /** `from` counts the value itself in, `over` does not */
  boundary: 'over' | 'from';
}

/** Whether a threshold is reached; `too_close` within two standard uncertainties of it. */
export type ThresholdStanding = 'below' | 'reached' | 'too_close';

/**
 * How a weighed mass, g with its standard uncertainty, stands to a threshold, compared exactly.
 * @example thresholdStanding({ value: '0.55', unit: 'lb', boundary: 'over' }, { mass: 249.6, u: 0 }) // → 'reached'
 * @example thresholdStanding({ value: '250', unit: 'g', boundary: 'from' }, { mass: 249.6, u: 0 }) // → 'below'
 */
export function thresholdStanding(
  { value, unit, boundary }: MassThreshold,
  { mass, u }: { mass: number; u: number },
): ThresholdStanding {
  const limit = { quantity: 'mass', bound: 'max', value, unit, inclusive: boundary === 'over' } as const;
  const { verdict } = judge(
    limit,
    { quantity: 'mass', value: { value: String(mass), u } },
    { k: 2, step: '0.1' },
  );
  if (verdict === 'too_close') return 'too_close';
  return verdict === 'inside' ? 'below' : 'reached';
}
