import { liftsOf } from './flight-points.ts';
import { laySurface, newMemory, type EstimateMemory, type LaidSurface } from './laid-surface.ts';
import { itemLine, solidLine, type LineWithLump } from './lines.ts';
import { loadingOf, speedAt, squareDecimetres } from './loading.ts';
import { centroid, NOTHING, sumLumps, type Lump } from './lump.ts';
import { noticeBoard, type Notice } from './notices.ts';
import { balanceUncertainty, massUncertainty, percentOfMac } from './balance.ts';
import { reynoldsNumber } from './atmosphere.ts';
import { classAreaOf } from './planform.ts';
import type { Plan } from './plan.ts';
import type { Balance, Estimate, Inertia, Line, Totals } from './result.ts';
import { sparOf } from './spar.ts';

/** Lowest Reynolds number at which a light section still gives the lift that is usually asked of it. */
const LOW_REYNOLDS = 20_000;

/**
 * The whole answer from one plan: planforms, a line for each part, item and solid, totals, balance, loading and
 * speeds. Pure and synchronous: the same code answers in the browser while typing and on the server. The plan must
 * satisfy `planSchema`. What does not fit is told in `notices`, in the order found, each once.
 *
 * Who estimates again and again while a plan is edited hands the same `memory` in each time: surfaces that are the
 * very objects of the time before are not measured again. The answer is the same without.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example estimate(EXAMPLE_PLAN).totals.mass // → 19.256
 */
export function estimate(plan: Plan, memory: EstimateMemory = newMemory()): Estimate {
  const { notices, tell } = noticeBoard();
  const laid = plan.surfaces.map((surface) => laySurface(plan, surface, memory));
  memory.surfaces = laid;
  for (const { shapeNotices } of laid) shapeNotices.forEach(tell);
  for (const { partNotices } of laid) partNotices.forEach(tell);
  const lines = [
    ...laid.flatMap((surface) => surface.lines),
    ...plan.solids.map((solid) => solidLine(plan, solid, tell)),
    ...plan.items.map(itemLine),
  ];
  const totals = totalsOf(lines, laid);
  const lifts = liftsOf(laid);
  const balance = balanceOf(plan, lines, totals, lifts, tell);
  const wing = laid.find(({ surface }) => surface.role === 'wing');
  const classArea = classAreaOfAll(laid);
  const wingArea = lifts?.wingArea ?? 0;
  const clMax = plan.flight?.clMax ?? 1;
  const density = plan.flight?.airDensity ?? 1.225;
  const stall = speedAt(totals.mass, wingArea, clMax, density);
  const reynolds = stall === null || !lifts ? null : reynoldsNumber(stall, lifts.mac, density);
  if (reynolds !== null && reynolds < LOW_REYNOLDS && clMax > 0.9) {
    tell({ code: 'reynolds_low', path: 'plan', reynolds, clMax });
  }
  return {
    planform: Object.fromEntries(laid.map(({ surface, planform }) => [surface.key, planform])),
    lines: lines.map(({ line }) => line),
    totals,
    balance,
    loading: {
      wing: loadingOf(totals.mass, wingArea),
      classArea: classArea > NOTHING ? squareDecimetres(classArea) : null,
      classLoading: loadingOf(totals.mass, classArea),
    },
    speeds: { stall, reynolds },
    spar: wing
      ? sparOf(plan, wing.surface, wing.line, totals.mass - totals.wingMass)
      : { stations: [], worst: null },
    notices,
  };
}

function totalsOf(lines: readonly LineWithLump[], laid: readonly LaidSurface[]): Totals {
  const sum = sumLumps(lines.map(({ lump }) => lump));
  const wings = new Set(
    laid.filter(({ surface }) => surface.role === 'wing').map(({ surface }) => surface.key),
  );
  const byGroup = new Map<string, number>();
  let wingMass = 0;
  for (const { line } of lines) {
    byGroup.set(line.group, (byGroup.get(line.group) ?? 0) + line.mass);
    if (line.surface !== null && wings.has(line.surface)) wingMass += line.mass;
  }
  return {
    mass: sum.amount,
    u: massUncertainty(lines.map(({ line }) => line)),
    at: centroid(sum),
    wingMass,
    byGroup: Object.fromEntries(byGroup),
    inertia: inertiaOf(sum),
  };
}

/** Moments of inertia about axes through the balance point, g·mm²: I_xx = Σm(y² + z²) − M(ȳ² + z̄²), and so on. */
function inertiaOf(sum: Lump): Inertia | null {
  const at = centroid(sum);
  if (!at) return null;
  const [x, y, z] = at.map((v, i) => Math.max(0, (sum.second[i] ?? 0) - sum.amount * v * v));
  return { xx: (y ?? 0) + (z ?? 0), yy: (x ?? 0) + (z ?? 0), zz: (x ?? 0) + (y ?? 0) };
}

function classAreaOfAll(laid: readonly LaidSurface[]): number {
  return laid
    .filter(({ surface }) => surface.role !== 'fin')
    .reduce((sum, { surface, line }) => sum + classAreaOf(surface, line), 0);
}

function balanceOf(
  plan: Plan,
  lines: readonly LineWithLump[],
  totals: Totals,
  lifts: ReturnType<typeof liftsOf>,
  tell: (notice: Notice) => void,
): Balance {
  if (!lifts) tell({ code: 'no_wing', path: 'plan' });
  if (!totals.at) tell({ code: 'no_mass', path: 'plan' });
  const neutralPoint = lifts?.neutralPoint ?? null;
  if (lifts && neutralPoint === null) tell({ code: 'no_tailplane', path: 'plan' });
  if (!totals.at) {
    return { x: null, u: null, percentMac: null, uPercentMac: null, neutralPoint, staticMargin: null };
  }
  const x = totals.at[0];
  const u = balanceUncertainty(
    lines.map(({ line }: { line: Line }) => ({ mass: line.mass, x: line.at[0], u: line.u })),
  );
  if (!lifts) return { x, u, percentMac: null, uPercentMac: null, neutralPoint, staticMargin: null };
  const percentMac = percentOfMac(x, lifts.xLeMac, lifts.mac);
  const staticMargin = neutralPoint === null ? null : (neutralPoint - x) / lifts.mac;
  if (staticMargin !== null && staticMargin < 0) {
    tell({ code: 'balance_aft_of_neutral_point', path: 'plan', byMm: -staticMargin * lifts.mac });
  }
  const byPercentMac = plan.target ? percentMac - plan.target.percentMac : 0;
  if (plan.target && Math.abs(byPercentMac) > plan.target.tolerance) {
    tell({
      code: 'balance_outside_target',
      path: 'plan',
      byMm: (byPercentMac / 100) * lifts.mac,
      byPercentMac,
    });
  }
  return {
    x,
    u,
    percentMac,
    uPercentMac: u === null ? null : (100 * u) / lifts.mac,
    neutralPoint,
    staticMargin,
  };
}
