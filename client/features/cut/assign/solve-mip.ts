import type { Highs } from 'highs';
import type { MipAnswer } from '#shared/core/cut/assign-search.ts';

export interface MipTerms {
  seconds: number;
  /** an answer this near to the bound will do, as a fraction of it and in the objective’s unit */
  relativeGap: number;
  absoluteGap: number;
  /** told while the solver works: the best found and the bound */
  progress?: (primal: number, bound: number) => void;
}

/** Solves a mixed-integer programme in LP format; it blocks, so it is called in a worker. Null where nothing was found. */
export function solveMip(highs: Highs, lp: string, terms: MipTerms): MipAnswer | null {
  return highs.withModel({ format: 'lp', data: lp }, (model) => {
    model.options.set({
      output_flag: false,
      time_limit: terms.seconds,
      mip_rel_gap: terms.relativeGap,
      mip_abs_gap: terms.absoluteGap,
    });
    const { progress } = terms;
    const { modelStatus } = model.run(
      progress
        ? {
            [highs.constants.callbackType.mipLogging]: ({ data }) => {
              const { mip_primal_bound: primal, mip_dual_bound: bound } = data;
              if (primal !== undefined && bound !== undefined) progress(primal, bound);
              return undefined;
            },
          }
        : undefined,
    );
    const { optimal, timeLimit } = highs.constants.modelStatus;
    const isFound = model.info.get('primal_solution_status') === 2;
    if (!isFound || (modelStatus !== optimal && modelStatus !== timeLimit)) return null;
    const { colValue } = model.getSolution();
    const ones: string[] = [];
    colValue.forEach((value, i) => {
      if (value > 0.5) ones.push(model.getColName(i));
    });
    return { ones, bound: Number(model.info.get('mip_dual_bound')), isCut: modelStatus === timeLimit };
  });
}
