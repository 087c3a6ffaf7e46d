import type { Plan } from '#shared/core/plan.ts';
import type { Estimate, Line } from '#shared/core/result.ts';
import { formatNumber, formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { figureOf, makingOfPart, makingOfSolid, type Making } from './why-part.ts';

/** How a figure was made. */
export interface Why {
  /** `10.31 g = 92.08 cm³ × 112 kg/m³` */
  formula: string;
  steps: string[];
  /** where the uncertainty comes from */
  doubt: string | null;
  source: string | null;
}

/** Masses, arms and moments in one reader's units. */
const sayIn = (units: Units) => ({
  grams: (value: number) => units.format(value, 'mass', { fine: true }),
  doubt: (value: number) => units.doubt(value, 'mass', { fine: true }),
  mm: (value: number) => units.format(value, 'length'),
  moment: (value: number) => units.format(value, 'moment'),
});

/** Why one line weighs what it weighs and where it stands. */
export function whyLine(plan: Plan, line: Line, units: Units): Why {
  const { grams, doubt, mm, moment } = sayIn(units);
  const [place, ...rest] = line.id.split('/');
  const id = rest.join('/');
  const material = line.material === null ? undefined : plan.materials[line.material];
  const balance = `Its centre of mass lies ${mm(Math.abs(line.at[0]))} ${line.at[0] < 0 ? 'ahead of' : 'aft of'} the datum: ${grams(line.mass)} × ${mm(line.at[0])} = ${moment(line.moment)}.`;
  if (!material) {
    return {
      formula: `${grams(line.mass)} as entered`,
      steps: [balance],
      doubt:
        line.u > 0
          ? `±${NARROW_SPACE}${doubt(line.u)} as entered with it.`
          : 'Entered without an uncertainty, so taken as exact.',
      source: null,
    };
  }
  const making = makingOf(plan, line, place ?? '', id, units);
  const byArea = line.volume === null || material.density === undefined;
  const measure =
    byArea && line.area !== null ? units.format(line.area, 'area', { small: true }) : making.measure;
  const multiplied = measure === null ? '' : ` = ${measure} × ${figureOf(material, byArea, units)}`;
  return {
    formula: `${grams(line.mass)}${multiplied}`,
    steps: [...making.steps, balance],
    doubt: `±${NARROW_SPACE}${doubt(line.u)}: ${material.name} is known to ±${NARROW_SPACE}${formatQuantity(material.cv, 'fineShare')}.`,
    source: material.source ? `${material.name}: ${material.source}` : null,
  };
}

function makingOf(plan: Plan, line: Line, place: string, id: string, units: Units): Making {
  const surface = plan.surfaces.find(({ key }) => key === line.surface);
  const part = surface?.parts.find((one) => one.id === id);
  if (surface && part) return makingOfPart(plan, surface, part, line, units);
  const solid = place === 'solid' ? plan.solids.find((one) => one.id === id) : undefined;
  return solid ? makingOfSolid(solid, line, units) : { measure: null, steps: [] };
}

/** Why a group, or the whole model, comes to its figures. */
export function whySum(lines: readonly Line[], units: Units): Why {
  const { grams, doubt, mm, moment } = sayIn(units);
  const mass = lines.reduce((sum, line) => sum + line.mass, 0);
  const total = lines.reduce((sum, line) => sum + line.moment, 0);
  const u = Math.hypot(...lines.map((line) => line.u));
  const [heaviest] = [...lines].sort((a, b) => b.mass - a.mass);
  const [widest] = [...lines].sort((a, b) => b.u - a.u);
  return {
    formula: `${grams(mass)} = sum of ${lines.length} ${lines.length === 1 ? 'line' : 'lines'}${heaviest ? `, most of all ${heaviest.name} ${grams(heaviest.mass)}` : ''}`,
    steps: [
      mass > 0
        ? `Arm = moment ÷ mass = ${moment(total)} ÷ ${grams(mass)} = ${mm(total / mass)}.`
        : 'Without a mass it has no arm.',
      'Printed lines are rounded so that each column adds up to its total; no figure is moved by a whole last digit.',
    ],
    doubt: `±${NARROW_SPACE}${doubt(u)}: the lines' own uncertainties in quadrature (JCGM 100:2008, 5.1.2)${widest && widest.u > 0 ? `, most of all ${widest.name} ±${NARROW_SPACE}${doubt(widest.u)}` : ''}.`,
    source: null,
  };
}

/** Why it balances there. */
export function whyBalance(
  { totals, balance }: Pick<Estimate, 'totals' | 'balance'>,
  chord: { from: number; to: number } | null,
  units: Units,
): Why {
  const { grams, mm, moment } = sayIn(units);
  const { x, u, percentMac } = balance;
  const all = totals.mass * (x ?? 0);
  const mac = chord ? chord.to - chord.from : 0;
  const steps =
    chord && percentMac !== null && x !== null
      ? [
          `Of the mean aerodynamic chord: 100 × (${mm(x)} − ${mm(chord.from)}) ÷ ${mm(mac)} = ${formatNumber(percentMac, 1)}${NARROW_SPACE}% MAC; the chord is ∫c² ds ÷ ∫c ds of the wing, its leading edge the chord-weighted mean.`,
        ]
      : [];
  return {
    formula: `${mm(x ?? 0)} = sum of moments ÷ sum of masses = ${moment(all)} ÷ ${grams(totals.mass)}`,
    steps,
    doubt:
      u === null
        ? null
        : `±${NARROW_SPACE}${units.doubt(u, 'length')}: each line by its distance from the balance point, (xᵢ − x) ÷ M × uᵢ, in quadrature (JCGM 100:2008, 5.1.2).`,
    source: null,
  };
}
