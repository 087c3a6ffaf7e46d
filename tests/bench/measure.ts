/** One line of the bench: what was measured and the ratio to what it is measured against, in the same run. */
export interface Ratio {
  what: string;
  ours: string;
  beside: string;
  ratio: number;
  /** the ratio that is asked for at most */
  most?: number;
  /** a bound on a time of day's work, which a busy machine may break: told, but no failure */
  timed?: true;
}

/** Median milliseconds of a call, after a warm-up, over as many rounds as fit into `budgetMs`. */
export function medianMs(call: () => void, budgetMs = 1500): number {
  for (let i = 0; i < 30; i++) call();
  const times: number[] = [];
  const end = performance.now() + budgetMs;
  while (performance.now() < end && times.length < 2000) {
    const start = performance.now();
    call();
    times.push(performance.now() - start);
  }
  return quantiles(times).median;
}

/** Median and 95th of a hundred. */
export interface Spread {
  median: number;
  late: number;
}

export function quantiles(times: readonly number[]): Spread {
  const sorted = [...times].sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.floor(sorted.length * share)] ?? Number.NaN;
  return { median: at(0.5), late: at(0.95) };
}

export const ms = (value: number) => `${value.toPrecision(3)} ms`;
export const spread = ({ median, late }: Spread) => `${ms(median)}, 95th ${ms(late)}`;
