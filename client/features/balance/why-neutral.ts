import { downwashSlope, liftSlope } from '#shared/core/aero.ts';
import { planformOf } from '#shared/core/planform.ts';
import type { Plan, SurfaceRole } from '#shared/core/plan.ts';
import type { Balance } from '#shared/core/result.ts';
import { formatNumber, formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { Why } from './why.ts';

const TAIL_EFFICIENCY = 0.9;
const figure = (value: number, digits = 3) => formatNumber(value, digits);

/** How the neutral point comes about; null where there is none. */
export function whyNeutralPoint(
  plan: Plan,
  { neutralPoint, staticMargin, x }: Balance,
  units: Units,
): Why | null {
  if (neutralPoint === null || x === null || staticMargin === null) return null;
  const mm = (value: number) => units.format(value, 'length');
  const numbers = numbersOf(plan);
  return {
    formula: `Static margin ${formatQuantity(staticMargin, 'fineShare')} = (${mm(neutralPoint)} − ${mm(x)}) ÷ MAC`,
    steps: [
      'Neutral point of wing and tail together: h = (¼ + k·h_t) ÷ (1 + k), with k = η·(S_t/S)·(a_t/a_w)·(1 − dε/dα).',
      ...(numbers ? [numbers] : []),
      'Lift slopes by aspect ratio (Helmbold), downwash 2a/(π·AR). Sweep and fuselage are left out; the fuselage moves the point forward.',
    ],
    doubt: 'An estimate: the glide test decides.',
    source: null,
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
  return `Here η = ${figure(TAIL_EFFICIENCY, 1)}, S_t/S = ${figure(areas)}, a_t/a_w = ${figure(at, 2)}/${figure(aw, 2)}, dε/dα = ${figure(downwash)}, so k = ${figure(k)}; h_t = ${figure(ht, 2)} and h = ${figure(100 * h, 1)}${NARROW_SPACE}% MAC.`;
}
