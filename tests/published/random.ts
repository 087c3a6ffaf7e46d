/** Multiplier and increment of a 32-bit linear congruential generator (Numerical Recipes, 2nd ed., section 7.1). */
const MULTIPLIER = 1664525;
const INCREMENT = 1013904223;

/** The same draws in every run: uniform on (0, 1) from a seed. */
export function seededUniform(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, MULTIPLIER) + INCREMENT) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
}

/** Standard normal draws (Box and Muller, 1958). */
export function seededNormal(seed: number): () => number {
  const uniform = seededUniform(seed);
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}
