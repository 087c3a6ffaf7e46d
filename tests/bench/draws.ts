import { DEFAULT_DRAWS, drawMasses } from '#shared/core/draws.ts';
import { layoutOf } from '#shared/core/draws-layout.ts';
import { foldPlan, type FoldedPlan } from '#shared/core/linear-model.ts';
import { weigh } from '#shared/core/linear-model-weigh.ts';
import { estimate } from '#shared/core/estimate.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';
import { seededNormal } from '#tests/published/random.ts';
import { medianMs, ms, type Ratio } from './measure.ts';

/**
 * The same multiplications without anything around them: for every draw and line (mass + slope · normal) ·
 * (1 + tolerance · even) and its moment, then every deviate times what mass and balance came to. Chance lies ready in
 * arrays; ours has to draw it.
 */
function bareLoop(fold: FoldedPlan): () => void {
  const { mass, slope, tolerance, x, evens } = layoutOf(fold, {});
  const n = mass.length;
  const draw = seededNormal(1);
  const normal = Float64Array.from({ length: n * DEFAULT_DRAWS }, draw);
  const even = Float64Array.from({ length: evens * DEFAULT_DRAWS }, draw);
  const sheets = [...tolerance.keys()].filter((i) => (tolerance[i] ?? 0) > 0);
  const last = Math.max(...sheets) + 1;
  const place = Int32Array.from({ length: last }, (_, i) => Math.max(0, sheets.indexOf(i)));
  const out = { mass: new Float64Array(DEFAULT_DRAWS), x: new Float64Array(DEFAULT_DRAWS) };
  const sums = [new Float64Array(n), new Float64Array(n)] as const;
  return () => {
    const { mass: whole } = weigh(fold);
    for (let i = 0; i < DEFAULT_DRAWS; i++) {
      let total = 0;
      let moment = 0;
      for (let line = 0; line < n; line++) {
        let one = (mass[line] ?? 0) + (slope[line] ?? 0) * (normal[i * n + line] ?? 0);
        if (line < last) one *= 1 + (tolerance[line] ?? 0) * (even[i * evens + (place[line] ?? 0)] ?? 0);
        total += one;
        moment += one * (x[line] ?? 0);
      }
      out.mass[i] = total;
      out.x[i] = moment / total;
      for (let line = 0; line < n; line++) {
        const deviate = normal[i * n + line] ?? 0;
        sums[0][line] = (sums[0][line] ?? 0) + deviate * (total - whole);
        sums[1][line] = (sums[1][line] ?? 0) + deviate * (moment / total);
      }
    }
  };
}

/** Twenty thousand draws of the largest demo glider, and a fold beside the estimate that it stands for. */
export function benchDraws(): Ratio[] {
  const plans = DEMO_NAMES.map(demoPlan).map((plan) => ({ plan, fold: foldPlan(plan) }));
  const { plan, fold } = plans.reduce((a, b) => (b.fold.lines.length > a.fold.lines.length ? b : a));
  const bare = bareLoop(fold);
  const beside = medianMs(bare);
  const ours = medianMs(() => void drawMasses(fold, { seed: 1 }));
  const full = medianMs(() => void estimate(plan));
  const weighing = medianMs(() => void weigh(fold));
  const what = `${plan.name}, ${fold.lines.length} lines`;
  return [
    {
      what: `${DEFAULT_DRAWS} draws, ${what}`,
      ours: ms(ours),
      beside: `the same multiplications, chance lying ready, ${ms(beside)}`,
      ratio: ours / beside,
      most: 3,
    },
    {
      what: `another wood on the folded plan, ${what}`,
      ours: ms(weighing),
      beside: `full estimate ${ms(full)}`,
      ratio: weighing / full,
    },
  ];
}
