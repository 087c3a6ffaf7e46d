import { positionOfPercent } from './balance.ts';
import type { Target } from './plan.ts';
import type { Estimate } from './result.ts';
import { sheetGroups } from './sheet-groups.ts';
import type { WingReference } from './wing-reference.ts';

/** One group of the balance sheet, hung at its arm. */
export interface HungMass {
  key: string;
  name: string;
  /** g */
  mass: number;
  /** its centre of mass, mm aft of the datum */
  x: number;
  /** ids of the estimate's lines that it is made of */
  lines: string[];
}

/** The picture of the balance: every group hung at its arm from one bar that tips about the wanted point. mm, g. */
export interface Beam {
  /** from nose to tail */
  masses: HungMass[];
  /** the wanted balance point, or where it balances when none is asked for */
  pivot: number;
  wanted: { x: number; from: number; to: number; percentMac: number } | null;
  /** where it balances, `u` the standard uncertainty */
  balance: { x: number; u: number; percentMac: number | null; uPercentMac: number | null };
  /** the mean aerodynamic chord */
  chord: { from: number; to: number } | null;
  neutralPoint: number | null;
  /** moment about the pivot, g·mm; positive: the tail goes down */
  leftOver: number;
  /** degrees; positive: the tail goes down */
  tilt: number;
}

/** The bar never leans further than this, degrees. */
export const TILT_LIMIT = 3.5;
/** What counts as a small distance from the pivot where no tolerance is given, % of MAC … */
const SMALL_PERCENT = 2;
/** … and where there is no chord either, mm. */
const SMALL_MM = 2;

/**
 * The beam of an estimate; null where nothing has a mass. Without a wing (`reference` null) no point can be wanted.
 * The moment left over is M·(x − x_pivot).
 * @example beamOf(EXAMPLE_ESTIMATE, { area: 100_000, mac: 100, xLeMac: 0 }, { percentMac: 40, tolerance: 2 }).leftOver // → -503.84
 */
export function beamOf(
  estimate: Pick<Estimate, 'lines' | 'totals' | 'balance'>,
  reference: WingReference | null,
  target: Target | undefined,
): Beam | null {
  const { x, u, percentMac, uPercentMac, neutralPoint } = estimate.balance;
  if (x === null) return null;
  const wanted = reference && target ? wantedPoint(reference, target) : null;
  const pivot = wanted?.x ?? x;
  const leftOver = estimate.totals.mass * (x - pivot);
  return {
    masses: hungMasses(estimate),
    pivot,
    wanted,
    balance: { x, u: u ?? 0, percentMac, uPercentMac },
    chord: reference && { from: reference.xLeMac, to: reference.xLeMac + reference.mac },
    neutralPoint,
    leftOver,
    tilt: tiltOf(x - pivot, smallDistance(reference, target)),
  };
}

function hungMasses(estimate: Pick<Estimate, 'lines'>): HungMass[] {
  return sheetGroups(estimate.lines)
    .flatMap(({ key, name, lines }): HungMass[] => {
      const mass = lines.reduce((sum, line) => sum + line.mass, 0);
      if (mass <= 0) return [];
      const x = lines.reduce((sum, line) => sum + line.moment, 0) / mass;
      return [{ key, name, mass, x, lines: lines.map(({ id }) => id) }];
    })
    .sort((a, b) => a.x - b.x);
}

function wantedPoint({ xLeMac, mac }: WingReference, { percentMac, tolerance }: Target) {
  const at = (percent: number) => positionOfPercent(percent, xLeMac, mac);
  return { x: at(percentMac), from: at(percentMac - tolerance), to: at(percentMac + tolerance), percentMac };
}

function smallDistance(reference: WingReference | null, target: Target | undefined): number {
  if (!reference) return SMALL_MM;
  return ((target?.tolerance || SMALL_PERCENT) / 100) * reference.mac;
}

/**
 * How far the bar leans, degrees, when the balance point lies `by` mm aft of the pivot: half the limit at `small`
 * mm (above 0), always more for more, never beyond the limit.
 * @example tiltOf(2, 2) // → 1.75
 */
export function tiltOf(by: number, small: number): number {
  return (TILT_LIMIT * 2 * Math.atan(by / small)) / Math.PI;
}
