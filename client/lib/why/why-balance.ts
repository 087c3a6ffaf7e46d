import type { WingReference } from '#shared/core/wing-reference.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { IN_QUADRATURE, sayIn } from './say.ts';
import type { Asked, Why, WhyInput } from './why.ts';

/** Lines told by name: those that pull most. */
const TOLD = 4;

/** Why it balances there; null where nothing has a mass. */
export function whyBalance(
  { result, units }: Omit<Asked, 'plan'>,
  chord: Pick<WingReference, 'mac' | 'xLeMac'> | null,
): Why | null {
  const { grams, mm, moment } = sayIn(units);
  const { lines, totals, balance } = result;
  const { x, u, percentMac } = balance;
  if (x === null) return null;
  const steps =
    chord && percentMac !== null
      ? [
          `Of the mean aerodynamic chord: 100 × (${mm(x)} − ${mm(chord.xLeMac)}) ÷ ${mm(chord.mac)} = ${formatNumber(percentMac, 1)}${NARROW_SPACE}% MAC.`,
        ]
      : [];
  const pulling = [...lines].sort((a, b) => Math.abs(b.moment) - Math.abs(a.moment)).slice(0, TOLD);
  return {
    title: 'Balance point',
    formula: `${mm(x)} = sum of moments ÷ sum of masses = ${moment(totals.mass * x)} ÷ ${grams(totals.mass)}`,
    steps,
    inputs: [
      ...pulling.map((line): WhyInput => ({
        name: line.name,
        value: moment(line.moment),
        ask: { of: 'line', id: line.id },
      })),
      { name: 'All masses', value: grams(totals.mass), ask: { of: 'total' } },
      ...(chord
        ? [{ name: 'Mean aerodynamic chord', value: mm(chord.mac), ask: { of: 'chord' as const } }]
        : []),
    ],
    doubt:
      u === null
        ? null
        : `±${NARROW_SPACE}${units.doubt(u, 'length')}: each line by its distance from the balance point, (xᵢ − x) ÷ M × uᵢ, ${IN_QUADRATURE}.`,
    source: 'Arms and moments: FAA-H-8083-1B, Weight and Balance Handbook, ch. 2.',
  };
}
