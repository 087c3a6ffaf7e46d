import { Decimal } from 'decimal.js';

/**
 * Rounds figures to `digits` decimals so that they add up to `total`, by largest remainder: all are taken down to
 * the last printed digit, and those with the largest remainders are taken up again until the sum is met (the
 * earlier one where two are alike). `total` must be the sum of the figures, taken up or down to that digit; no
 * figure then moves by as much as one unit of the last digit, and one that is exact to it stays.
 * @example apportion([0.25, 0.25, 0.5], 1, 1).map(String) // → ['0.3', '0.2', '0.5']
 */
export function apportion(
  figures: readonly Decimal.Value[],
  total: Decimal.Value,
  digits: number,
): Decimal[] {
  const unit = new Decimal(10).pow(-digits);
  const parts = figures.map((figure, index) => {
    const exact = new Decimal(figure);
    const down = exact.toDecimalPlaces(digits, Decimal.ROUND_FLOOR);
    return { index, down, left: exact.minus(down) };
  });
  const short = new Decimal(total)
    .minus(Decimal.sum(0, ...parts.map(({ down }) => down)))
    .div(unit)
    .toNumber();
  const up = new Set(
    [...parts]
      .sort((a, b) => b.left.comparedTo(a.left) || a.index - b.index)
      .slice(0, Math.max(0, short))
      .map(({ index }) => index),
  );
  return parts.map(({ down, index }) => (up.has(index) ? down.plus(unit) : down));
}
