import { cosDegrees } from '#shared/core/frame.ts';
import { addChords, chordIntegrals, type ChordIntegrals } from '#shared/core/planform.ts';
import type { Surface } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { UNITS } from '#shared/units/units.ts';
import { panelsOf } from './part-inputs.ts';
import type { PlanformFigure } from './question.ts';
import { sayIn } from './say.ts';
import type { Asked, Why, WhyInput } from './why.ts';

const MAC_SOURCE =
  'Mean aerodynamic chord: E. L. Houghton and P. W. Carpenter, Aerodynamics for Engineering Students.';
const DRAWN = 'As exact as the drawing: nothing here is measured.';

/** The chord that balance is told by: of all wings together; null without one. */
export function whyChord({ plan, units }: Asked): Why | null {
  const wings = plan.surfaces.filter(({ role }) => role === 'wing');
  if (wings.length === 0) return null;
  const chords = addChords(
    wings.flatMap((wing) => {
      const half = chordIntegrals(wing);
      return wing.mirrored ? [half, half] : [half];
    }),
  );
  return {
    title: 'Mean aerodynamic chord',
    ...chordSteps(chords, units),
    inputs: wings.flatMap((wing) => inputsOf(wing, units)),
    doubt: DRAWN,
    source: MAC_SOURCE,
  };
}

function chordSteps(chords: ChordIntegrals, units: Units): Pick<Why, 'formula' | 'steps'> {
  const { mm, area } = sayIn(units);
  const mac = chords.square / chords.area;
  return {
    formula: `${mm(mac)} = ∫c² ds ÷ ∫c ds = ${cubed(chords.square, units)} ÷ ${area(chords.area)}`,
    steps: [
      `Its leading edge lies at ∫x c ds ÷ ∫c ds = ${mm(chords.leadingEdge / chords.area)}: the mean of the real one, weighted by chord, which on a cranked wing is not the leading edge at that place.`,
      'A panel of length b from chord c₁ to c₂ adds b·(c₁² + c₁c₂ + c₂²) ÷ 3 above and b·(c₁ + c₂) ÷ 2 below; a tip block adds its half ellipse.',
    ],
  };
}

/** ∫c² ds in the reader's unit of length, cubed. */
function cubed(mm3: number, units: Units): string {
  const unit = units.unit('length') as 'mm';
  const { factor, label } = UNITS[unit];
  return `${formatNumber(mm3 / factor ** 3, factor > 1 ? 2 : 0)}\u202f${label}³`;
}

/** One figure of one surface's planform; null where it has none. */
export function whyPlanform({ plan, result, units }: Asked, key: string, figure: PlanformFigure): Why | null {
  const surface = plan.surfaces.find((one) => one.key === key);
  const planform = result.planform[key];
  if (!surface || !planform) return null;
  const { mm, area } = sayIn(units);
  const chords = chordIntegrals(surface);
  const halves = surface.mirrored ? 2 : 1;
  const twice = surface.mirrored ? '2 × ' : '';
  const about = (title: string, formula: string, steps: string[], source: string | null = null): Why => ({
    title: `${title} of the ${key}`,
    formula,
    steps,
    inputs: inputsOf(surface, units),
    doubt: DRAWN,
    source,
  });
  switch (figure) {
    case 'areaDeveloped':
      return about(
        'Developed area',
        `${area(planform.areaDeveloped)} = ${twice}∫c ds = ${twice}${area(chords.area)}`,
        [
          'As laid on the board: a panel of length b from chord c₁ to c₂ has b·(c₁ + c₂) ÷ 2; a tip block a quarter of π × chord × length.',
        ],
      );
    case 'areaProjected':
      return about(
        'Projected area',
        `${area(planform.areaProjected)} = ${twice}∫c cos(dihedral) ds = ${twice}${area(chords.projected)}`,
        [
          `As seen from above: each panel by the cosine of its dihedral; ${area(halves * (chords.area - chords.projected))} less than laid on the board.`,
        ],
      );
    case 'span': {
      const along = surface.panels.reduce(
        (sum, { span, dihedral }) => sum + span * Math.abs(cosDegrees(dihedral)),
        0,
      );
      const off = surface.mirrored ? Math.max(0, surface.apex[1]) : 0;
      const tips = planform.span - halves * (off + along);
      return about(
        'Span',
        `${mm(planform.span)} = ${twice}${off > 0 ? `(${mm(off)} + ${mm(along)})` : mm(along)}${tips > 0.05 ? ` + ${mm(tips)} of tip blocks` : ''}`,
        [
          `Along the panels, each by the cosine of its dihedral${off > 0 ? ', and what the root stands away from the middle' : ''}: from tip to tip as seen from above.`,
        ],
      );
    }
    case 'aspectRatio':
      return planform.aspectRatio === null
        ? null
        : about(
            'Aspect ratio',
            `${units.format(planform.aspectRatio, 'ratio')} = span² ÷ projected area = (${mm(planform.span)})² ÷ ${area(planform.areaProjected)}`,
            [],
          );
    case 'mac':
    case 'xLeMac': {
      const { formula, steps } = chordSteps(chords, units);
      return about('Mean aerodynamic chord', formula, steps, MAC_SOURCE);
    }
    case 'yMac':
      return about(
        'Place of the mean aerodynamic chord',
        `${mm(planform.yMac)} = ∫y c ds ÷ ∫c ds of one half`,
        ['Where the chord-weighted middle of the half lies from the plane of symmetry.'],
        MAC_SOURCE,
      );
  }
}

function inputsOf(surface: Surface, units: Units): WhyInput[] {
  const tips = surface.parts.flatMap((part): WhyInput[] =>
    part.kind === 'tipBlock'
      ? [
          {
            name: part.name,
            value: `${units.size(part.length)} long`,
            at: { place: 'drawing', line: `${surface.key}/${part.id}`, field: 'Length' },
          },
        ]
      : [],
  );
  return [...panelsOf(surface, null, units), ...tips];
}
