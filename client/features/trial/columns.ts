import type { TrialFigure } from '#client/lib/why/question.ts';
import type { TrialRefusal, TrialResult } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';

interface Column {
  figure: TrialFigure;
  label: string;
  quantity: Quantity;
  /** the one that decides */
  strong?: boolean;
  /** one digit more */
  fine?: boolean;
}

/** What trials are compared by, in the order of the table. */
export const COLUMNS: readonly Column[] = [
  { figure: 'wingBare', label: 'Wing, bare', quantity: 'mass' },
  { figure: 'wingMass', label: 'Wing, covered', quantity: 'mass' },
  { figure: 'percentMac', label: 'Before trim, MAC', quantity: 'percentMac' },
  { figure: 'ballast', label: 'Ballast', quantity: 'mass' },
  { figure: 'allUp', label: 'All up', quantity: 'mass', strong: true },
  { figure: 'wingLoading', label: 'Wing loading', quantity: 'loading', fine: true },
  { figure: 'classLoading', label: 'Class loading', quantity: 'loading', fine: true },
  { figure: 'margin', label: 'Spar margin', quantity: 'ratio' },
];

/** What stands under a figure: the place of a margin, or what a class minimum adds. */
export function underOf(result: TrialResult, figure: TrialFigure, units: Units): string {
  if (figure === 'margin' && result.marginAt !== null) {
    return result.marginAt === 0 ? 'at the root' : `${units.format(result.marginAt, 'length')} out`;
  }
  if (figure === 'allUp' && (result.added ?? 0) > 0) {
    return `${units.format(result.added, 'mass')} of it to the minimum`;
  }
  return '';
}

/** Why no ballast trims a trial, and where weight would have to come off. */
export function refusalText(refused: TrialRefusal | null, arm: number, units: Units): string {
  switch (refused?.refused) {
    case 'at_wanted_point':
      return 'none: the arm lies on the balance point';
    case 'wrong_side':
      return refused.takeOff === null
        ? 'none: balances on the other side already'
        : `none: ${units.format(refused.takeOff, 'mass')} would have to come off at ${units.format(arm, 'length')}`;
    default:
      return 'none: nothing has a mass';
  }
}
