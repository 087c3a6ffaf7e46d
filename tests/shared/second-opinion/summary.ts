import type { Vec3 } from '#shared/core/frame.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate, Line, Planform, Totals } from '#shared/core/result.ts';
import { Heap } from './heap.ts';
import { classArea, neutralPoint, slicePlanform } from './outlook.ts';

type Told =
  'id' | 'pieces' | 'length' | 'area' | 'volume' | 'mass' | 'u' | 'at' | 'moment' | 'group' | 'surface';
export type SecondLine = Pick<Line, Told> & { heap: Heap; wood: boolean };
export type SecondOpinion = Omit<Estimate, 'lines' | 'spar' | 'notices'> & { lines: SecondLine[] };

/** Everything that an estimate says beside its lines. */
export function summaryOf(plan: Plan, lines: SecondLine[]): Omit<SecondOpinion, 'lines'> {
  const planform = Object.fromEntries(plan.surfaces.map((surface) => [surface.key, slicePlanform(surface)]));
  const ofRole = (role: Surface['role']) => plan.surfaces.filter((surface) => surface.role === role);
  const together = (surfaces: Surface[]) => (surfaces.length > 0 ? slicePlanform(...surfaces) : undefined);
  const wing = together(ofRole('wing'));
  const totals = totalsOf(plan, lines);
  const area = [...ofRole('wing'), ...ofRole('tailplane')].reduce(
    (sum, surface) => sum + classArea(surface, slicePlanform(surface)) / 1e4,
    0,
  );
  const { clMax = 1, airDensity = 1.225 } = plan.flight ?? {};
  const newtons = (totals.mass / 1000) * 9.80665;
  const stall = wing ? Math.sqrt((2 * newtons) / (airDensity * wing.areaProjected * 1e-6 * clMax)) : null;
  // Sutherland's law at 15 °C, US Standard Atmosphere 1976.
  const viscosity = (1.458e-6 * 288.15 ** 1.5) / (288.15 + 110.4);
  return {
    planform,
    totals,
    balance: balanceOf(totals, lines, wing, together(ofRole('tailplane'))),
    loading: {
      wing: wing ? totals.mass / (wing.areaProjected / 1e4) : null,
      classArea: area > 0 ? area : null,
      classLoading: area > 0 ? totals.mass / area : null,
    },
    speeds: {
      stall,
      reynolds: wing && stall !== null ? (airDensity * stall * (wing.mac / 1000)) / viscosity : null,
    },
  };
}

const massOf = (lines: SecondLine[]) => lines.reduce((sum, line) => sum + line.mass, 0);

function totalsOf(plan: Plan, lines: SecondLine[]): Totals {
  const all = new Heap();
  for (const line of lines) all.addAll(line.heap);
  const at = all.amount > 0 ? all.centre : null;
  const groups = [...new Set(lines.map(({ group }) => group))];
  const wings = plan.surfaces.filter(({ role }) => role === 'wing').map(({ key }) => key);
  return {
    mass: all.amount,
    u: Math.hypot(...lines.map((line) => line.u)),
    at,
    wingMass: massOf(lines.filter(({ surface }) => surface !== null && wings.includes(surface))),
    byGroup: Object.fromEntries(
      groups.map((group) => [group, massOf(lines.filter((line) => line.group === group))]),
    ),
    inertia: at && inertiaAbout(all, at),
  };
}

function inertiaAbout(all: Heap, at: Vec3) {
  const [x2, y2, z2] = all.second.map((sum, i) => sum - all.amount * (at[i] ?? 0) ** 2) as Vec3;
  return { xx: y2 + z2, yy: x2 + z2, zz: x2 + y2 };
}

/** Lines are taken as independent of one another, for a plan knows of no common piece of wood. */
function balanceOf(
  totals: Totals,
  lines: SecondLine[],
  wing?: Planform,
  tail?: Planform,
): Estimate['balance'] {
  const x = totals.at?.[0] ?? null;
  const u = x === null ? null : Math.hypot(...lines.map((line) => ((line.at[0] - x) / totals.mass) * line.u));
  const point = neutralPoint(wing, tail);
  return {
    x,
    u,
    percentMac: wing && x !== null ? (100 * (x - wing.xLeMac)) / wing.mac : null,
    uPercentMac: wing && u !== null ? (100 * u) / wing.mac : null,
    neutralPoint: point,
    staticMargin: wing && point !== null && x !== null ? (point - x) / wing.mac : null,
  };
}
