import type { BuiltState } from './as-built-state.ts';
import { massAt } from './as-built-state.ts';

/** One weighing as it speaks of one material. */
export interface MaterialEvidence {
  weighing: string;
  /** measured over estimated, and its standard uncertainty */
  ratio: number;
  u: number;
  /** other materials were on the scale with it, so that the ratio is of all of them together */
  mixed: boolean;
}

/** What was held of a material, what weighings said, and what is held now; all as multiples of its figure. */
export interface MaterialNews {
  key: string;
  name: string;
  /** how far a part of it may lie off, before … */
  prior: { mean: number; sd: number };
  evidence: MaterialEvidence[];
  /** … and after */
  posterior: { mean: number; sd: number };
  /** forecast of its parts still to come, g */
  toCome: number;
}

/**
 * What the weighings say of each material, in the order in which the plan's lines name them.
 * @example materialNews(EXAMPLE_BUILT, EXAMPLE_PLAN.materials)[0].posterior // → { mean: 1, sd: 0.1 }
 */
export function materialNews(
  state: BuiltState,
  table: Readonly<Record<string, { name: string; cv: number }>>,
): MaterialNews[] {
  return state.materials.map((key, k) => ({
    key,
    name: table[key]?.name ?? key,
    prior: { mean: 1, sd: table[key]?.cv ?? 0 },
    evidence: state.heard.flatMap(({ id, fresh, rest, uRest }) => {
      const kinds = new Set(fresh.map((i) => state.lines[i]?.material));
      const estimated = fresh.reduce((sum, i) => sum + (state.lines[i]?.mass ?? 0), 0);
      if (!kinds.has(key) || !(estimated > 0) || !(rest > 0)) return [];
      return [{ weighing: id, ratio: rest / estimated, u: uRest / estimated, mixed: kinds.size > 1 }];
    }),
    posterior: {
      mean: state.belief.mean[k] ?? 1,
      sd: Math.sqrt((state.belief.cov[k]?.[k] ?? 0) + (state.own[k] ?? 0)),
    },
    toCome: state.lines.reduce(
      (sum, { material }, i) => (material === key && state.by[i] === null ? sum + massAt(state, i) : sum),
      0,
    ),
  }));
}
