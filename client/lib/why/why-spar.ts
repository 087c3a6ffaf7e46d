import { nearestToStrength } from '#shared/core/deflection.ts';
import { atLoadFactor } from '#shared/core/load-cases.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { sayIn } from './say.ts';
import type { Asked, Why, WhyInput } from './why.ts';

/** How near the spar is to its strength at a station of the half span; null where no strip carries there. */
export function whySpar({ plan, result, units }: Asked, s: number, loadFactor: number): Why | null {
  const { grams } = sayIn(units);
  const planned = plan.flight?.loadFactor ?? 1;
  const here = atLoadFactor(result.spar.stations, planned, loadFactor).find((station) => station.s === s);
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  if (!here || !wing) return null;
  const strength = (value: number) => units.format(value, 'strength');
  const worst = nearestToStrength(plan, wing, s);
  const strips = result.lines.filter(
    ({ id }) => id === worst || wing.parts.some((part) => isSpar(part) && id === `${wing.key}/${part.id}`),
  );
  const carried = result.totals.mass - result.totals.wingMass;
  return {
    title: `Spar margin ${units.format(s, 'length')} from the root`,
    formula: `${formatNumber(here.margin, 2)} = strength ÷ stress = ${strength(here.margin * here.stress)} ÷ ${strength(here.stress)}`,
    steps: [
      `Stress of the outer fibre: M·E·e ÷ ΣEI with M = ${formatNumber(here.moment, 0)}${NARROW_SPACE}N·mm; top and bottom strips bend about their common axis, weighted by modulus.`,
      `The load: ${grams(carried)} that the wing carries × ${formatNumber(loadFactor, 1)}, spread as the mean of the real chord and the ellipse of equal area.`,
    ],
    inputs: [
      ...strips.map((line): WhyInput => ({
        name: line.name,
        value: (line.material === null ? undefined : plan.materials[line.material]?.name) ?? '',
        at: { place: 'drawing', line: line.id, field: 'Material' },
      })),
      { name: 'Mass of the model', value: grams(result.totals.mass), ask: { of: 'total' } },
    ],
    doubt:
      'Strengths are averages by density. Grain, knots and glue decide; it is no licence to launch hard.',
    source: 'Spanwise load: O. Schrenk, NACA TM 948.',
  };
}

const isSpar = (part: { kind: string; seat?: string }) =>
  part.kind === 'strip' && (part.seat === 'top' || part.seat === 'bottom');
