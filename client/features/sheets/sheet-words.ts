import type { Estimate } from '#shared/core/result.ts';
import type { Units } from '#shared/format/units.ts';
import type { SheetSummaryDto } from '#shared/schemas/sheet.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';

/** A sheet's moment, the same in every place that it is printed: `2026-12-01 09:30 UTC`. */
export function sheetMoment(iso: string): string {
  return `${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`;
}

/** First figures of the check code in groups of four, to be compared by eye. */
export function checkCode(sha256: string): string {
  return sha256.slice(0, 12).replace(/(.{4})(?=.)/g, '$1 ');
}

export interface SheetsHeadline {
  headline: string;
  detail: string;
}

type Present = Pick<Estimate, 'totals' | 'balance'>;
const percent = (value: number | null) =>
  value === null ? '' : ` at ${formatNumber(value, 1)}${NARROW_SPACE}%\u00a0MAC`;

/** What the newest sheet says, and how far the plan has gone since. */
export function sheetsHeadline(
  newest: SheetSummaryDto | undefined,
  { totals, balance }: Present,
  units: Units,
): SheetsHeadline {
  if (!newest) {
    return {
      headline: 'No sheet saved yet',
      detail: 'Saving one freezes the plan and its figures under a number; later changes leave it as it is.',
    };
  }
  const headline = `Sheet ${newest.number}: ${units.format(newest.mass, 'mass')}${percent(newest.percentMac)}`;
  const heavier = totals.mass - newest.mass;
  const moved = (balance.percentMac ?? 0) - (newest.percentMac ?? 0);
  if (Math.abs(heavier) < 0.05 && Math.abs(moved) < 0.05) {
    return { headline, detail: 'The plan comes to the same mass and balance now.' };
  }
  const mass = units.format(heavier, 'mass', { plus: true });
  const balanceMoved = `${formatNumber(moved, 1, { plus: true })}${NARROW_SPACE}%\u00a0MAC`;
  return { headline, detail: `The plan has changed since: ${mass}, balance ${balanceMoved}.` };
}
