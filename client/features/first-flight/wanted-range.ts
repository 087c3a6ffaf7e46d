import { percentOfMac, positionOfPercent } from '#shared/core/balance.ts';
import { rangeOfMargins } from '#shared/core/field/wind-ballast.ts';
import type { Target } from '#shared/core/plan.ts';
import type { WingReference } from '#shared/core/wing-reference.ts';
import type { FlightDraft } from './draft.ts';

/** What the range may be taken from. */
export interface RangeSources {
  target: Target | undefined;
  wing: WingReference | null;
  /** mm aft of the datum */
  neutralPoint: number | null;
}

/** Where the model is to balance, mm aft of the datum. */
export interface WantedRange {
  from: number;
  to: number;
  aim: number;
  basis: 'plan' | 'static_margin' | 'typed';
}

/** What can be offered, the plan's own range first. */
export function basesOf({ target, wing, neutralPoint }: RangeSources): WantedRange['basis'][] {
  return [
    ...(target && wing ? (['plan'] as const) : []),
    ...(wing && neutralPoint !== null ? (['static_margin'] as const) : []),
    'typed',
  ];
}

/** The range asked for; null while it is not all there, or runs backwards. */
export function wantedRange(
  sources: RangeSources,
  draft: Pick<FlightDraft, 'basis' | 'margins' | 'typed'>,
): WantedRange | null {
  const bases = basesOf(sources);
  const basis = draft.basis !== null && bases.includes(draft.basis) ? draft.basis : (bases[0] ?? 'typed');
  const { target, wing, neutralPoint } = sources;
  if (basis === 'plan' && target && wing) {
    const at = (percent: number) => positionOfPercent(percent, wing.xLeMac, wing.mac);
    const { percentMac, tolerance } = target;
    return { from: at(percentMac - tolerance), to: at(percentMac + tolerance), aim: at(percentMac), basis };
  }
  const ends =
    basis === 'static_margin' && wing && neutralPoint !== null
      ? rangeOfMargins(neutralPoint, wing.mac, draft.margins)
      : draft.typed;
  const { from, to } = ends;
  if (from === null || to === null || from > to) return null;
  return { from, to, aim: (from + to) / 2, basis };
}

/** A place in % of the mean chord; null without a wing. */
export const percentAt = (x: number, wing: WingReference | null): number | null =>
  wing && percentOfMac(x, wing.xLeMac, wing.mac);
