import { tradeOffs } from '#shared/core/trade-offs.ts';
import type { TrialResult } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';
import { formatQuantity } from '#shared/format/numbers.ts';

/** What going from one trial to another does. */
export interface Step {
  /** g saved without ballast; negative where it costs some */
  bare: number;
  /** g saved all up; null where either cannot be trimmed */
  allUp: number | null;
  margin: { from: number; to: number } | null;
}

/** Less than this, g, is no difference. */
const NOTHING = 0.05;

export function stepOf(from: TrialResult, to: TrialResult): Step {
  return {
    bare: from.bare - to.bare,
    allUp: from.allUp === null || to.allUp === null ? null : from.allUp - to.allUp,
    margin: from.margin === null || to.margin === null ? null : { from: from.margin, to: to.margin },
  };
}

/** Words round the two figures of the sentence, which can be asked themselves. */
export interface Sentence {
  /** `Light ribs save` */
  before: string;
  bare: string | null;
  /** `; after re-trim` */
  between: string;
  allUp: string | null;
  after: string;
}

/** `Light ribs: saves 3.1 g; after re-trim 4.0 g; spar margin unchanged at 2.6`. */
export function sentenceOf(name: string, { bare, allUp, margin }: Step, units: Units): Sentence {
  const grams = (value: number) => units.format(Math.abs(value), 'mass');
  const after = marginWords(margin);
  if (Math.abs(bare) < NOTHING && Math.abs(allUp ?? 0) < NOTHING) {
    return { before: `${name}: no difference in mass`, bare: null, between: '', allUp: null, after };
  }
  const verb = bare >= 0 ? 'saves' : 'costs';
  const start = { before: `${name}: ${verb} `, bare: grams(bare) };
  if (allUp === null)
    return { ...start, between: ', but it cannot be trimmed at this arm', allUp: null, after: '' };
  const turned = bare * allUp < 0 ? (allUp > 0 ? ' saved' : ' more') : '';
  return { ...start, between: '; after re-trim ', allUp: grams(allUp), after: `${turned}${after}` };
}

export const wholeSentence = ({ before, bare, between, allUp, after }: Sentence): string =>
  [before, bare, between, allUp, after].join('');

function marginWords(margin: Step['margin']): string {
  if (!margin) return '';
  const [from, to] = [margin.from, margin.to].map((value) => formatQuantity(value, 'ratio'));
  return from === to ? `; spar margin unchanged at ${to}` : `; spar margin ${to} instead of ${from}`;
}

/** Digits that masses, g, and margins are told to: what looks the same is no reason to prefer one. */
const TOLD = { mass: 10, margin: 100 };

/** Which trials nothing beats in both all-up mass and spar margin, as far as they are told. */
export function bestTrades(results: readonly TrialResult[]): boolean[] {
  const told = (value: number | null, digits: number) =>
    value === null ? null : Math.round(value * digits) / digits;
  return tradeOffs(results, {
    small: ({ allUp }) => told(allUp, TOLD.mass),
    large: ({ margin }) => told(margin, TOLD.margin),
  });
}

/** The trial that saves most once trimmed: what the page opens with. The first is as drawn. */
export function bestOf(results: readonly TrialResult[]): number {
  const drawn = results[0];
  if (!drawn || results.length < 2) return 0;
  const [best] = results
    .slice(1)
    .map((result, i) => ({ index: i + 1, saved: stepOf(drawn, result).allUp ?? -Infinity }))
    .sort((a, b) => b.saved - a.saved);
  return best?.index ?? 0;
}
