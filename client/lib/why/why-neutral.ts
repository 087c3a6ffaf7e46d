import { downwashSlope, liftSlope } from '#shared/core/aero.ts';
import { planformOf } from '#shared/core/planform.ts';
import type { Plan, SurfaceRole } from '#shared/core/plan.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import { percent, sayIn } from './say.ts';
import type { Asked, Why, WhyInput } from './why.ts';

const TAIL_EFFICIENCY = 0.9;
const figure = (value: number, digits = 3) => formatNumber(value, digits);

const DOUBT =
  'An estimate without the fuselage, which moves the point forward, and without sweep: the glide test decides.';
const SOURCE =
  'Lift slopes by aspect ratio: H. B. Helmbold (1942), J. D. Anderson, Aircraft Performance and Design, eq. 2.18a. Downwash 2a/(π·AR): R. C. Nelson, Flight Stability and Automatic Control, ch. 2.';

/** How the neutral point comes about; null where there is none. */
export function whyNeutralPoint({ plan, result, units }: Asked): Why | null {
  const { mm } = sayIn(units);
  const { neutralPoint } = result.balance;
  const chord = wingReference(plan);
  if (neutralPoint === null || !chord) return null;
  const h = (neutralPoint - chord.xLeMac) / chord.mac;
  const numbers = numbersOf(plan);
  return {
    title: 'Neutral point',
    formula: `${mm(neutralPoint)} = ${mm(chord.xLeMac)} + ${figure(h)} × ${mm(chord.mac)}, at ${percent(100 * h)} MAC`,
    steps: [
      'Wing and tail together: h = (¼ + k·h_t) ÷ (1 + k), with k = η·(S_t/S)·(a_t/a_w)·(1 − dε/dα).',
      ...(numbers ? [numbers] : []),
    ],
    inputs: [
      { name: 'Mean aerodynamic chord', value: mm(chord.mac), ask: { of: 'chord' } },
      ...plan.surfaces.flatMap(({ key, role }): WhyInput[] => {
        const planform = result.planform[key];
        if (!planform || role === 'fin') return [];
        return [
          {
            name: `Aspect ratio of the ${key}`,
            value: units.format(planform.aspectRatio, 'ratio'),
            ask: { of: 'planform', surface: key, figure: 'aspectRatio' },
          },
        ];
      }),
    ],
    doubt: DOUBT,
    source: SOURCE,
  };
}

/** How the static margin comes about; null where there is none. */
export function whyStaticMargin({ plan, result, units }: Asked): Why | null {
  const { mm } = sayIn(units);
  const { neutralPoint, staticMargin, x, u } = result.balance;
  const chord = wingReference(plan);
  if (neutralPoint === null || staticMargin === null || x === null || !chord) return null;
  return {
    title: 'Static margin',
    formula: `${formatQuantity(staticMargin, 'fineShare')} = (neutral point ${mm(neutralPoint)} − balance point ${mm(x)}) ÷ MAC ${mm(chord.mac)}`,
    steps: [],
    inputs: [
      { name: 'Neutral point', value: mm(neutralPoint), ask: { of: 'neutralPoint' } },
      { name: 'Balance point', value: mm(x), ask: { of: 'balance' } },
      { name: 'Mean aerodynamic chord', value: mm(chord.mac), ask: { of: 'chord' } },
    ],
    doubt: `${u === null ? '' : `±\u202f${units.doubt(u, 'length')} of the balance point makes ±\u202f${percent((100 * u) / chord.mac)}. `}${DOUBT}`,
    source: SOURCE,
  };
}

/** The formula's numbers, where one wing and one tailplane make them. */
function numbersOf(plan: Plan): string | null {
  const only = (role: SurfaceRole) => {
    const [one, other] = plan.surfaces.filter((surface) => surface.role === role);
    return one && !other ? planformOf(one) : null;
  };
  const [wing, tail] = [only('wing'), only('tailplane')];
  if (!wing?.aspectRatio || !tail?.aspectRatio) return null;
  const [aw, at] = [liftSlope(wing.aspectRatio), liftSlope(tail.aspectRatio)];
  const downwash = downwashSlope(wing.aspectRatio, aw);
  const areas = tail.areaProjected / wing.areaProjected;
  const k = TAIL_EFFICIENCY * areas * (at / aw) * (1 - downwash);
  const ht = (tail.xLeMac + tail.mac / 4 - wing.xLeMac) / wing.mac;
  const h = (0.25 + k * ht) / (1 + k);
  return `Here η = ${figure(TAIL_EFFICIENCY, 1)}, S_t/S = ${figure(areas)}, a_t/a_w = ${figure(at, 2)}/${figure(aw, 2)}, dε/dα = ${figure(downwash)}, so k = ${figure(k)}; h_t = ${figure(ht, 2)} and h = ${percent(100 * h)} MAC.`;
}
