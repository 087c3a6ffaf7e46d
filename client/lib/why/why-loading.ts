import { reynoldsNumber, airAt } from '#shared/core/atmosphere.ts';
import { GRAVITY } from '#shared/core/frame.ts';
import { loadingOf, speedAt, squareDecimetres } from '#shared/core/loading.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { convert } from '#shared/units/units.ts';
import type { AreaKind } from './question.ts';
import { sayIn } from './say.ts';
import type { Asked, Why, WhyInput } from './why.ts';

const MM2_PER_DM2 = squareDecimetres(1) ** -1;
const WORDS: Record<AreaKind, string> = {
  projected: 'projected wing area',
  developed: 'developed wing area',
  class: 'class area',
};

/** mm²; null where there is none */
function areaOf({ plan, result }: Asked, kind: AreaKind): number | null {
  if (kind === 'class') {
    const { classArea } = result.loading;
    return classArea === null ? null : classArea * MM2_PER_DM2;
  }
  const wings = plan.surfaces
    .filter(({ role }) => role === 'wing')
    .flatMap(({ key }) => result.planform[key] ?? []);
  const field = kind === 'projected' ? 'areaProjected' : 'areaDeveloped';
  return wings.length === 0 ? null : wings.reduce((sum, wing) => sum + wing[field], 0);
}

/** An area by its definition, from the surfaces that it counts. */
export function whyArea(asked: Asked, kind: AreaKind): Why | null {
  const { plan, result, units } = asked;
  const { area } = sayIn(units);
  const total = areaOf(asked, kind);
  if (total === null) return null;
  const figure = kind === 'developed' ? 'areaDeveloped' : 'areaProjected';
  const counted = plan.surfaces.filter(
    ({ role }) => role === 'wing' || (kind === 'class' && role === 'tailplane'),
  );
  const own = counted.reduce((sum, { key }) => sum + (result.planform[key]?.[figure] ?? 0), 0);
  const carried = total - own;
  return {
    title: capital(WORDS[kind]),
    formula: `${area(total)} = ${counted.map(({ key }) => `${key} ${area(result.planform[key]?.[figure] ?? 0)}`).join(' + ')}${kind === 'class' && carried > 0.5 ? ` + carried through the fuselage ${area(carried)}` : ''}`,
    steps:
      kind === 'class'
        ? [
            'Wing and tailplane as seen from above, each at no incidence, the root chord carried on to the middle; the fin is not counted.',
          ]
        : [],
    inputs: counted.map(({ key }): WhyInput => ({
      name: capital(key),
      value: area(result.planform[key]?.[figure] ?? 0),
      ask: { of: 'planform', surface: key, figure },
    })),
    doubt: 'As exact as the drawing; a built wing is measured by its chords.',
    source: null,
  };
}

export function whyLoading(asked: Asked, kind: AreaKind): Why | null {
  const { result, units } = asked;
  const { grams, area, loading } = sayIn(units);
  const on = areaOf(asked, kind);
  const { mass, u } = result.totals;
  const value = on === null ? null : loadingOf(mass, on);
  if (on === null || value === null) return null;
  return {
    title: kind === 'class' ? 'Class loading' : `Loading of the ${WORDS[kind]}`,
    formula: `${loading(value)} = mass ÷ ${WORDS[kind]} = ${grams(mass)} ÷ ${area(on)}`,
    steps: [],
    inputs: [
      { name: 'Mass of the model', value: grams(mass), ask: { of: 'total' } },
      { name: capital(WORDS[kind]), value: area(on), ask: { of: 'area', kind } },
    ],
    doubt: `±${NARROW_SPACE}${units.doubt((value * u) / mass, 'loading', { fine: true })} from the mass; the area is taken as drawn.`,
    source: null,
  };
}

/** A speed of steady flight at a lift coefficient. */
export function whySpeed(asked: Asked, lift: number, density: number): Why | null {
  const { plan, result, units } = asked;
  const { grams, area, speed } = sayIn(units);
  const wing = wingReference(plan);
  const { mass, u } = result.totals;
  const value = wing === null || lift <= 0 ? null : speedAt(mass, wing.area, lift, density);
  if (wing === null || value === null) return null;
  return {
    title: `Speed at a lift coefficient of ${formatNumber(lift, 2)}`,
    formula: `${speed(value)} = √(2·M·g ÷ (ρ·S·C_L)) with M = ${grams(mass)}, S = ${area(wing.area)}, ρ = ${units.format(density, 'airDensity')}, C_L = ${formatNumber(lift, 2)}`,
    steps: [
      `g = ${formatNumber(GRAVITY, 5)}${NARROW_SPACE}m/s². Lift carries the weight: the definition of the lift coefficient, steady level flight.`,
    ],
    inputs: [
      { name: 'Mass of the model', value: grams(mass), ask: { of: 'total' } },
      { name: 'Projected wing area', value: area(wing.area), ask: { of: 'area', kind: 'projected' } },
      {
        name: 'Lift coefficient at the stall',
        value: formatNumber(plan.flight?.clMax ?? 1, 2),
        at: { place: 'loading', field: 'Lift coefficient at the stall' },
      },
    ],
    doubt: `The mass alone makes ±${NARROW_SPACE}${units.doubt((value * u) / (2 * mass), 'speed', { fine: true })}; what the section gives at this Reynolds number is known far less well.`,
    source: 'Standard gravity: NIST SP 811.',
  };
}

export function whyReynolds(asked: Asked, lift: number, density: number, viscosity: number): Why | null {
  const { plan, result, units } = asked;
  const { mm, speed } = sayIn(units);
  const wing = wingReference(plan);
  const value = wing === null || lift <= 0 ? null : speedAt(result.totals.mass, wing.area, lift, density);
  if (wing === null || value === null) return null;
  return {
    title: 'Reynolds number',
    formula: `${units.format(reynoldsNumber(value, wing.mac, density, viscosity), 'reynolds')} = ρ·V·c ÷ μ with V = ${speed(value)}, c = MAC ${mm(wing.mac)}, ρ = ${units.format(density, 'airDensity')}`,
    steps: [`μ = ${formatNumber(viscosity * 1e6, 2)} × 10⁻⁶${NARROW_SPACE}Pa·s, by Sutherland’s law.`],
    inputs: [
      { name: 'Speed', value: speed(value), ask: { of: 'speed', lift, density } },
      { name: 'Mean aerodynamic chord', value: mm(wing.mac), ask: { of: 'chord' } },
    ],
    doubt: 'Told to thousands: it tells the kind of flow, not more.',
    source: 'Viscosity: US Standard Atmosphere 1976.',
  };
}

export function whyAir({ units }: Asked, altitude: number, temperature: number): Why {
  const air = airAt(altitude, temperature);
  const long = units.long;
  return {
    title: 'Density of the air',
    formula: `${units.format(air.density, 'airDensity')} = p ÷ (R·T) with p = ${formatNumber(air.pressure / 100, 1)}${NARROW_SPACE}hPa, T = ${formatNumber(air.temperature, 2)}${NARROW_SPACE}K`,
    steps: [
      `The pressure is that of the standard atmosphere at ${formatNumber(convert(altitude, 'm', long), 0)}${NARROW_SPACE}${long}; R = 287.053${NARROW_SPACE}J/(kg·K) of dry air.`,
    ],
    inputs: [
      {
        name: 'Pressure altitude',
        value: `${formatNumber(convert(altitude, 'm', long), 0)}${NARROW_SPACE}${long}`,
        at: { place: 'loading', field: 'Pressure altitude' },
      },
      {
        name: 'Temperature',
        value: `${formatNumber(temperature, 1)}${NARROW_SPACE}°C`,
        at: { place: 'loading', field: 'Temperature' },
      },
    ],
    doubt: 'Damp air is lighter by up to two in a hundred on a hot day.',
    source: 'US Standard Atmosphere 1976, table 2 and section 1.2.',
  };
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
