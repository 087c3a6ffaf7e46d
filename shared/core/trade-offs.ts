/** Two aims of a choice: the first as small, the second as large as can be; null where a row cannot be told. */
export interface Aims<Row> {
  small: (row: Row) => number | null;
  large: (row: Row) => number | null;
}

/**
 * True of each row that nothing beats: no other is at least as good in both aims and better in one (Pareto, Manuale
 * di economia politica, 1906). Rows alike in both stand or fall together; a row without one of its figures is beaten.
 * @example tradeOffs([[10, 2], [12, 3], [12, 2]], { small: ([mass]) => mass, large: ([, margin]) => margin }) // → [true, true, false]
 */
export function tradeOffs<Row>(rows: readonly Row[], { small, large }: Aims<Row>): boolean[] {
  const told = rows.flatMap((row, index) => {
    const [low, high] = [small(row), large(row)];
    return low === null || high === null || Number.isNaN(low + high) ? [] : [{ index, low, high }];
  });
  told.sort((a, b) => a.low - b.low || b.high - a.high);
  const unbeaten = rows.map(() => false);
  let best: { low: number; high: number } | null = null;
  for (const { index, low, high } of told) {
    const alike = best !== null && best.low === low && best.high === high;
    if (best !== null && !alike && high <= best.high) continue;
    unbeaten[index] = true;
    best = { low, high };
  }
  return unbeaten;
}
