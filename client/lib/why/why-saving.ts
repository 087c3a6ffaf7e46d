import { runTrials } from '#shared/core/wood-trial.ts';
import type { WhyQuestion } from './question.ts';
import { sayIn } from './say.ts';
import type { Asked, Why } from './why.ts';

/** What going from one wood trial to another takes off. */
export function whySaving(
  { plan, units }: Asked,
  { figure, from, to, terms }: Extract<WhyQuestion, { of: 'saving' }>,
): Why | null {
  const { grams } = sayIn(units);
  const [before, after] = runTrials(plan, [from, to], terms).results.map((result) => result[figure]);
  if (typeof before !== 'number' || typeof after !== 'number') return null;
  const saved = before - after;
  const what = figure === 'bare' ? 'without ballast' : 'all up, re-trimmed';
  return {
    title: `${saved >= 0 ? 'Saved' : 'Added'} by ${to.name}, ${what}`,
    formula: `${grams(Math.abs(saved))} = ${grams(saved >= 0 ? before : after)} − ${grams(saved >= 0 ? after : before)}`,
    steps:
      figure === 'allUp'
        ? ['Both are brought to the same balance point, and to the same class minimum where one is set.']
        : [],
    inputs: [
      { name: from.name, value: grams(before), ask: { of: 'trial', figure, trial: from, terms } },
      { name: to.name, value: grams(after), ask: { of: 'trial', figure, trial: to, terms } },
    ],
    doubt: null,
    source: null,
  };
}
