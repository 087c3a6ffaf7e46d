import {
  chooseBallast,
  type BallastChoice,
  type BallastChoiceRefusal,
  type BallastPiece,
} from '#shared/core/field/ballast-pieces.ts';
import type { FieldFigures } from '#shared/core/field/field-account.ts';
import type { Plan } from '#shared/core/plan.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import type { Units } from '#shared/format/units.ts';
import type { BuildTermsDto } from '#shared/schemas/weighing.ts';
import type { WantedRange } from './wanted-range.ts';

/** Where ballast goes until somebody says otherwise, mm: the plan's foremost ballast, else its foremost item. */
export function usualPlace({ items }: Pick<Plan, 'items'>): number {
  const foremost = (of: Plan['items']) => Math.min(...of.map(({ at }) => at[0]));
  const ballast = items.filter(isBallast);
  const of = ballast.length > 0 ? ballast : items;
  return of.length > 0 ? foremost(of) : 0;
}

interface AdviceOptions {
  flown: FieldFigures;
  range: WantedRange;
  at: number;
  pieces: readonly BallastPiece[];
  terms: Pick<BuildTermsDto, 'least' | 'most' | 'ballastRoom'> | null;
  /** g aboard already in the room for ballast */
  aboard: number;
}

/** What to put in from the pieces at hand; where none are named, from as much putty as it takes. */
export function ballastAdvice({
  flown,
  range,
  at,
  pieces,
  terms,
  aboard,
}: AdviceOptions): BallastChoice | BallastChoiceRefusal {
  const room = terms?.ballastRoom ?? null;
  return chooseBallast(pieces.length > 0 ? pieces : [ANY], {
    mass: flown.mass,
    x: flown.x,
    at,
    range,
    least: terms?.least ?? null,
    most: terms?.most ?? null,
    room: room === null ? null : Math.max(0, room - aboard),
  });
}

/** Putty without end. g */
const ANY: BallastPiece = { id: 'putty', mass: 100_000, divisible: true };

/** Why nothing at hand does it, and what would. */
export function refusalWords(refusal: BallastChoiceRefusal, at: number, units: Units): string {
  const grams = (value: number) => units.format(value, 'mass');
  const place = `${units.format(Math.abs(at), 'length')} ${at < 0 ? 'ahead of' : 'aft of'} the datum`;
  switch (refusal.refused) {
    case 'wrong_place':
      return `No weight ${place} can do it: it would pull the wrong way. Choose a place on the other side, or take ballast out there.`;
    case 'too_little':
      return `The pieces at hand are ${grams(refusal.missing)} too light.`;
    case 'no_room':
      return `It needs ${grams(refusal.over)} more than there is room for. A place farther from the balance point needs less.`;
    case 'too_heavy':
      return `It would pass the greatest mass of its class by ${grams(refusal.over)}. A place farther from the balance point needs less.`;
    case 'no_sum':
      return refusal.above === null
        ? `The pieces at hand do not add up to it; the nearest below is ${grams(refusal.below)}.`
        : `The pieces at hand add up to ${grams(refusal.below)} or ${grams(refusal.above)}, and neither does it.`;
  }
}
