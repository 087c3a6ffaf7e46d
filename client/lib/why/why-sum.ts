import type { Line } from '#shared/core/result.ts';
import { NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { IN_QUADRATURE, sayIn } from './say.ts';
import type { Why } from './why.ts';

/** Lines told by name; the rest is in the sheet. */
const TOLD = 5;

/** Why a group, or the whole model, comes to its figures. */
export function whySum(title: string, lines: readonly Line[], units: Units): Why {
  const { grams, doubt, mm, moment } = sayIn(units);
  const mass = lines.reduce((sum, line) => sum + line.mass, 0);
  const total = lines.reduce((sum, line) => sum + line.moment, 0);
  const u = Math.hypot(...lines.map((line) => line.u));
  const heaviest = [...lines].sort((a, b) => b.mass - a.mass);
  const [widest] = [...lines].sort((a, b) => b.u - a.u);
  const rest = heaviest.slice(TOLD);
  return {
    title,
    formula: `${grams(mass)} = sum of ${lines.length} ${lines.length === 1 ? 'line' : 'lines'}`,
    steps: [
      mass > 0
        ? `Arm = moment ÷ mass = ${moment(total)} ÷ ${grams(mass)} = ${mm(total / mass)}.`
        : 'Without a mass it has no arm.',
      'Printed lines are rounded so that each column adds up to its total; no figure is moved by a whole last digit.',
    ],
    inputs: [
      ...heaviest.slice(0, TOLD).map((line) => ({
        name: line.name,
        value: grams(line.mass),
        ask: { of: 'line' as const, id: line.id },
      })),
      ...(rest.length > 0
        ? [{ name: `${rest.length} more`, value: grams(rest.reduce((sum, line) => sum + line.mass, 0)) }]
        : []),
    ],
    doubt: `±${NARROW_SPACE}${doubt(u)}: the lines’ own uncertainties ${IN_QUADRATURE}${widest && widest.u > 0 ? `, most of all ${widest.name} ±${NARROW_SPACE}${doubt(widest.u)}` : ''}.`,
    source: null,
  };
}
