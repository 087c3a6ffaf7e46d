/** One line of the bench: what was measured and the ratio to what it is measured against, in the same run. */
export interface Ratio {
  what: string;
  ours: string;
  beside: string;
  ratio: number;
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
  times.sort((a, b) => a - b);
  return times[Math.floor(times.length / 2)] ?? Number.NaN;
}

export const ms = (value: number) => `${value.toPrecision(3)} ms`;
