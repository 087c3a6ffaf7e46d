import type { TrialResult, TrialRun } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';

export interface TrialHeadline {
  headline: string;
  detail: string;
}

/** Less than this, g, is no difference. */
const NOTHING = 0.05;

/** What the trials come to, best first: `Light ribs save 3.1 g; after re-trim 4.0 g`. */
export function trialHeadline({ results }: Pick<TrialRun, 'results'>, units: Units): TrialHeadline {
  const [drawn, ...trials] = results;
  if (!drawn) return { headline: 'Nothing to compare', detail: '' };
  if (drawn.refused?.refused === 'no_mass') {
    return { headline: 'Nothing to compare yet', detail: 'The plan has no mass: draw its parts first.' };
  }
  const [best] = trials
    .map((trial) => ({ trial, ...savings(drawn, trial) }))
    .sort((a, b) => (b.trimmed ?? b.bare) - (a.trimmed ?? a.bare));
  if (!best) return { headline: 'As drawn', detail: 'Add a trial to compare it with.' };
  return {
    headline: sentence(best.trial.name, best.bare, best.trimmed, units),
    detail: detailOf(drawn, trials),
  };
}

function savings(drawn: TrialResult, trial: TrialResult): { bare: number; trimmed: number | null } {
  const trimmed = drawn.allUp === null || trial.allUp === null ? null : drawn.allUp - trial.allUp;
  return { bare: drawn.bare - trial.bare, trimmed };
}

function sentence(name: string, bare: number, trimmed: number | null, units: Units): string {
  const grams = (value: number) => units.format(value, 'mass');
  const rest =
    trimmed === null ? 'but it cannot be trimmed there' : `after re-trim ${grams(Math.abs(trimmed))}`;
  const turned = trimmed !== null && bare * trimmed < 0 ? (trimmed > 0 ? ' saved' : ' more') : '';
  if (Math.abs(bare) < NOTHING && Math.abs(trimmed ?? 0) < NOTHING) return `${name}: no difference in mass`;
  return `${name}: ${bare >= 0 ? 'saves' : 'costs'} ${grams(Math.abs(bare))}; ${rest}${turned}`;
}

function detailOf(drawn: TrialResult, trials: readonly TrialResult[]): string {
  const stuck = [drawn, ...trials].filter(({ refused }) => refused !== null).map(({ name }) => name);
  return stuck.length === 0 ? '' : `Not to be trimmed at this arm: ${stuck.join(', ')}.`;
}
