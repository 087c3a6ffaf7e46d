import { HyperFormula } from 'hyperformula';
import { estimate } from '#shared/core/estimate.ts';
import type { Estimate } from '#shared/core/result.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';
import { medianMs, ms, type Ratio } from './measure.ts';

/**
 * The balance sheet of an estimate as a builder would keep it in a spreadsheet: volume × density, arm, moment,
 * sums, balance point and its uncertainty. The volumes stand in it as typed figures: the geometry, which is most of
 * our own work, has no counterpart there.
 */
function spreadsheet(result: Estimate) {
  const rows = result.lines.map((line, i) => {
    const r = i + 1;
    const amount = line.volume ?? 1;
    const density = amount > 0 ? (line.mass / amount) * 1e6 : 0;
    return [
      amount,
      density,
      `=A${r}*B${r}/1000000`,
      line.at[0],
      `=C${r}*D${r}`,
      `=C${r}*${line.mass ? line.u / line.mass : 0}`,
    ];
  });
  const n = rows.length;
  const x = `E${n + 1}/C${n + 1}`;
  const terms = rows.map((_, i) => `((D${i + 1}-${x})/C${n + 1}*F${i + 1})^2`);
  const total = [null, null, `=SUM(C1:C${n})`, `=${x}`, `=SUM(E1:E${n})`, `=SQRT(${terms.join('+')})`];
  return HyperFormula.buildFromArray([...rows, total], { licenseKey: 'gpl-v3' });
}

/** One full estimate of the largest demo glider beside one recalculation of its sheet by a spreadsheet engine. */
export function benchEstimate(): Ratio[] {
  const plans = DEMO_NAMES.map(demoPlan).map((plan) => ({ plan, result: estimate(plan) }));
  const largest = plans.reduce((a, b) => (b.result.lines.length > a.result.lines.length ? b : a));
  const { plan, result } = largest;
  const sheet = spreadsheet(result);
  let density = 100;
  const recalculate = medianMs(() => {
    density = density === 100 ? 101 : 100;
    // Every density changes, as when a grade is swapped throughout; one batch, one recalculation.
    sheet.batch(() =>
      result.lines.forEach((_, row) => sheet.setCellContents({ sheet: 0, row, col: 1 }, density)),
    );
  });
  const full = medianMs(() => void estimate(plan));
  const checked = medianMs(() => void planSchema.parse(plan));
  sheet.destroy();
  const what = `${plan.name}, ${result.lines.length} lines`;
  return [
    {
      what: `full estimate, ${what}`,
      ours: ms(full),
      beside: `spreadsheet recalculation ${ms(recalculate)}`,
      ratio: full / recalculate,
    },
    {
      what: `full estimate, ${what}`,
      ours: ms(full),
      beside: '1 ms',
      ratio: full,
      most: 1,
      timed: true,
    },
    {
      what: `validation of the plan, ${what}`,
      ours: ms(checked),
      beside: `full estimate ${ms(full)}`,
      ratio: checked / full,
    },
  ];
}
