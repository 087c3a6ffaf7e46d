/** What is held of several unknowns at once: jointly normal. */
export interface Belief {
  mean: readonly number[];
  /** covariances, a row for each unknown */
  cov: readonly (readonly number[])[];
}

/** A measured sum of the unknowns, each times its weight, with the variance of what is not theirs. */
export interface Observation {
  weights: readonly number[];
  value: number;
  variance: number;
}

/**
 * What is held after an observation: the linear update of joint normals (conjugate for a known variance), k = C·w /
 * (wᵀCw + σ²), mean + k·(value − w·mean), C − k·(C·w)ᵀ. An observation that can tell nothing changes nothing.
 * @example observe({ mean: [1], cov: [[0.01]] }, { weights: [1], value: 1.1, variance: 0.01 }).mean // → [1.05]
 */
export function observe(belief: Belief, { weights, value, variance }: Observation): Belief {
  const spread = belief.cov.map((row) => dot(row, weights));
  const total = dot(spread, weights) + variance;
  if (!(total > 0)) return belief;
  const gain = spread.map((s) => s / total);
  const surprise = value - dot(belief.mean, weights);
  return {
    mean: belief.mean.map((m, i) => m + (gain[i] ?? 0) * surprise),
    cov: belief.cov.map((row, i) => row.map((c, j) => c - (gain[i] ?? 0) * (spread[j] ?? 0))),
  };
}

/**
 * What is held of one unknown after independent observations of it: normal prior, normal likelihood; precisions
 * add, and the mean is weighted by them (conjugate normal with known variances; Gelman et al., Bayesian Data
 * Analysis, 3rd ed., eqs 2.11 and 2.12, from memory). `sd` above 0.
 * @example normalUpdate({ mean: 1, sd: 0.1 }, [{ value: 1.1, sd: 0.1 }]).mean // → 1.05
 */
export function normalUpdate(
  prior: { mean: number; sd: number },
  observed: readonly { value: number; sd: number }[],
): { mean: number; sd: number } {
  const precision = observed.reduce((sum, { sd }) => sum + sd ** -2, prior.sd ** -2);
  const weighted = observed.reduce(
    (sum, { value, sd }) => sum + value * sd ** -2,
    prior.mean * prior.sd ** -2,
  );
  return { mean: weighted / precision, sd: precision ** -0.5 };
}

/**
 * Standard deviation of a sum of the unknowns, each times its weight.
 * @example spreadOf({ mean: [1, 1], cov: [[0.04, 0], [0, 0]] }, [10, 3]) // → 2
 */
export function spreadOf({ cov }: Belief, weights: readonly number[]): number {
  return Math.sqrt(
    Math.max(
      0,
      dot(
        cov.map((row) => dot(row, weights)),
        weights,
      ),
    ),
  );
}

const dot = (a: readonly number[], b: readonly number[]) => a.reduce((sum, v, i) => sum + v * (b[i] ?? 0), 0);
