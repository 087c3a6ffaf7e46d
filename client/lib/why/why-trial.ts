import { estimate } from '#shared/core/estimate.ts';
import { loadingOf } from '#shared/core/loading.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import { runTrials, type Trial } from '#shared/core/wood-trial.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import type { TrialFigure } from './question.ts';
import { sayIn } from './say.ts';
import { whyBalance } from './why-balance.ts';
import { whyBallast } from './why-ballast.ts';
import { whySum } from './why-sum.ts';
import type { Asked, Why, WhyInput } from './why.ts';

/** A figure of a wood trial: the plan without its ballast, in the woods of the trial, trimmed anew. */
export function whyTrial({ plan, units }: Asked, figure: TrialFigure, trial: Trial, arm: number): Why | null {
  const tried = withWood({ ...plan, items: plan.items.filter((item) => !isBallast(item)) }, trial.materials);
  const result = estimate(tried);
  const { results, wanted } = runTrials(plan, [trial], { arm });
  const [outcome] = results;
  if (!outcome) return null;
  const told = answerOf();
  return (
    told && { ...told, title: `${told.title}, ${trial.name}`, steps: [...woodsOf(trial), ...told.steps] }
  );

  function answerOf(): Why | null {
    const { grams, area, loading } = sayIn(units);
    const wing = wingReference(tried);
    switch (figure) {
      case 'wingMass': {
        const wings = new Set(tried.surfaces.filter(({ role }) => role === 'wing').map(({ key }) => key));
        const lines = result.lines.filter(({ surface }) => surface !== null && wings.has(surface));
        return unlinked(whySum('Mass of the wing', lines, units));
      }
      case 'bare':
        return unlinked(whySum('Mass without ballast', result.lines, units));
      case 'percentMac': {
        const why = whyBalance({ result, units }, wing);
        return why && unlinked(why);
      }
      case 'ballast': {
        const why = wanted === null ? null : whyBallast({ result, units }, arm, wanted);
        return why && unlinked(why);
      }
      case 'allUp':
        if (outcome?.ballast === undefined || outcome.ballast === null || outcome.allUp === null) return null;
        return {
          title: 'Mass all up',
          formula: `${grams(outcome.allUp)} = ${grams(outcome.bare)} + ${grams(outcome.ballast)} of ballast`,
          steps: [],
          inputs: [
            {
              name: 'Without ballast',
              value: grams(outcome.bare),
              ask: { of: 'trial', figure: 'bare', trial, arm },
            },
            {
              name: 'Ballast',
              value: grams(outcome.ballast),
              ask: { of: 'trial', figure: 'ballast', trial, arm },
            },
          ],
          doubt: `±\u202f${units.doubt(outcome.u, 'mass', { fine: true })}, that of the parts; the ballast is weighed.`,
          source: null,
        };
      case 'wingLoading': {
        const allUp = outcome?.allUp ?? null;
        const value = allUp === null || wing === null ? null : loadingOf(allUp, wing.area);
        if (allUp === null || wing === null || value === null) return null;
        return {
          title: 'Wing loading',
          formula: `${loading(value)} = mass all up ÷ projected wing area = ${grams(allUp)} ÷ ${area(wing.area)}`,
          steps: [],
          inputs: [
            { name: 'Mass all up', value: grams(allUp), ask: { of: 'trial', figure: 'allUp', trial, arm } },
            { name: 'Projected wing area', value: area(wing.area), ask: { of: 'area', kind: 'projected' } },
          ],
          doubt: null,
          source: null,
        };
      }
    }
  }
}

/** Figures of a trial are not those of the plan that lies on the desk, so they lead to none of it. */
function unlinked(why: Why): Why {
  return { ...why, inputs: why.inputs.map(({ name, value }): WhyInput => ({ name, value })) };
}

function woodsOf({ materials }: Trial): string[] {
  const woods = Object.entries(materials).map(
    ([group, { material }]) => `${sheetGroupName(group)} of ${material.name}`,
  );
  return woods.length === 0
    ? []
    : [`${woods.join(', ')}; all else as drawn, the plan’s own ballast left out.`];
}
