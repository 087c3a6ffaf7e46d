import { budgetLeft } from '#shared/core/built/budget.ts';
import type { PanelMatch } from '#shared/core/built/panel-match.ts';
import type { Units } from '#shared/format/units.ts';
import type { BuildStage } from '#shared/schemas/weighing.ts';
import type { Built } from '#client/lib/built/use-built.ts';

export const STAGE_NAMES: Record<BuildStage, string> = {
  part: 'part',
  framed: 'framed',
  sheeted: 'sheeted',
  covered: 'covered',
  model: 'whole model',
};

/** What the account comes to, before any table. */
export function builtHeadline(
  { account, terms, counted }: Built,
  units: Units,
): { title: string; text: string; over: boolean } {
  const mass = (grams: number) => units.format(grams, 'mass');
  const forecast = `${units.format(account.mass, 'mass', { bare: true })} ± ${units.doubt(account.u, 'mass')}`;
  const left = terms.target === null ? null : budgetLeft(terms.target, account);
  const isClose = left !== null && Math.abs(left) <= account.u;
  const over = left !== null && left < 0 && !isClose;
  const target =
    left === null || terms.target === null
      ? ''
      : isClose
        ? `, as near as can be told to the ${mass(terms.target)} aimed at`
        : left < 0
          ? `, ${mass(-left)} over the ${mass(terms.target)} aimed at`
          : `, ${mass(left)} left of the ${mass(terms.target)} aimed at`;
  const parts = account.parts.filter(({ weighing }) => weighing !== null).length;
  return {
    over,
    title: `Forecast ${forecast}${target}`,
    text:
      counted.length === 0
        ? 'Nothing is weighed yet: this is what the drawing says. Weigh the first part that is done, and the forecast begins to narrow.'
        : `${mass(account.weighed)} of it on the scale, ${parts} of ${account.parts.length} parts; ${mass(account.toCome)} still to come.`,
  };
}

/** How a weighing lies to what was expected, said once it is written down. */
export function heardWords(
  { expected, uExpected, measured }: { expected: number; uExpected: number; measured: number },
  units: Units,
): string {
  const difference = measured - expected;
  const of = `the ${units.format(expected, 'mass')} expected`;
  if (Math.abs(difference) <= uExpected / 2) return `as ${of}`;
  const by = units.format(Math.abs(difference), 'mass');
  const far = Math.abs(difference) > 2 * uExpected ? ', more than wood’s usual spread: look at it' : '';
  return `${by} ${difference > 0 ? 'over' : 'under'} ${of}${far}`;
}

/** What two halves come to, and what levels them. */
export function matchWords(match: PanelMatch, units: Units): string {
  const { heavy, byMass, byRoll, matched, tipWeight } = match;
  const mass = units.format(byMass, 'mass');
  if (matched || heavy === null) {
    return `Matched as far as these weighings can tell: ${mass} and ${units.format(byRoll, 'moment')} apart about the roll axis.`;
  }
  const light = heavy === 'port' ? 'starboard' : 'port';
  const level =
    tipWeight === null ? '' : ` ${units.format(tipWeight, 'mass')} at the ${light} tip levels them.`;
  return `${heavy === 'port' ? 'Port' : 'Starboard'} pulls down by ${units.format(byRoll, 'moment')}; the halves are ${mass} apart.${level}`;
}
