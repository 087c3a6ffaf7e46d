import { Decimal } from 'decimal.js';

/**
 * Rounds a column so that the printed lines add up to the printed total to the last digit, and the printed total
 * is the true one rounded. What rounding line by line would leave over goes, one last digit each, to the lines that
 * it brings nearest to their true value.
 */
export function printedColumn(values: readonly number[], digits: number): { lines: string[]; total: string } {
  const exact = values.map((value) => new Decimal(value));
  const total = Decimal.sum(0, ...exact).toDecimalPlaces(digits);
  const rounded = exact.map((value) => value.toDecimalPlaces(digits));
  const step = new Decimal(10).pow(-digits);
  const steps = total
    .minus(Decimal.sum(0, ...rounded))
    .div(step)
    .toNumber();
  const sign = Math.sign(steps);
  const shortBy = (i: number) =>
    (exact[i] ?? total)
      .minus(rounded[i] ?? total)
      .times(sign)
      .toNumber();
  const chosen = new Set(
    values
      .map((_, i) => i)
      .toSorted((a, b) => shortBy(b) - shortBy(a))
      .slice(0, Math.abs(steps)),
  );
  const lines = rounded.map((value, i) => (chosen.has(i) ? value.plus(step.times(sign)) : value));
  return { lines: lines.map((value) => printed(value, digits)), total: printed(total, digits) };
}

/** Never “-0.00”. */
const printed = (value: Decimal, digits: number) => (value.isZero() ? new Decimal(0) : value).toFixed(digits);
