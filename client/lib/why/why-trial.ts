import { estimate } from '#shared/core/estimate.ts';
import { loadingOf } from '#shared/core/loading.ts';
import type { Item } from '#shared/core/plan.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { isBallast, trialBase } from '#shared/core/wood-trial-base.ts';
import { runTrials, type Trial, type TrialTerms } from '#shared/core/wood-trial.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import type { AreaKind, TrialFigure } from './question.ts';
import { sayIn } from './say.ts';
import { whyBalance } from './why-balance.ts';
import { whyBallast } from './why-ballast.ts';
import { whySpar } from './why-spar.ts';
import { whySum } from './why-sum.ts';
import type { Asked, Why, WhyInput } from './why.ts';

/** A figure of a wood trial: the plan without its ballast, in the woods of the trial, trimmed anew. */
export function whyTrial(
  { plan, units }: Asked,
  figure: TrialFigure,
  trial: Trial,
  terms: TrialTerms,
): Why | null {
  const tried = withWood({ ...plan, items: plan.items.filter((item) => !isBallast(item)) }, trial.materials);
  const result = estimate(tried);
  const { results, wanted } = runTrials(plan, [trial], terms);
  const [outcome] = results;
  if (!outcome) return null;
  const names = new Map(result.lines.map(({ id, name }) => [id, name]));
  const told = answerOf();
  return (
    told && {
      ...told,
      title: `${told.title}, ${trial.name}`,
      steps: [...woodsOf(trial, names), ...told.steps],
    }
  );

  function answerOf(): Why | null {
    const { grams, area, loading } = sayIn(units);
    const added = outcome?.added ?? 0;
    const wing = wingReference(tried);
    const wings = new Set(tried.surfaces.filter(({ role }) => role === 'wing').map(({ key }) => key));
    const { covers, classArea } = trialBase(plan);
    switch (figure) {
      case 'wingMass': {
        const lines = result.lines.filter(({ surface }) => surface !== null && wings.has(surface));
        return unlinked(whySum('Mass of the wing', lines, units));
      }
      case 'wingBare': {
        const lines = result.lines.filter(
          ({ id, surface }) => surface !== null && wings.has(surface) && !covers.has(id),
        );
        return unlinked(whySum('Mass of the wing without covering', lines, units));
      }
      case 'bare':
        return unlinked(whySum('Mass without ballast', result.lines, units));
      case 'percentMac': {
        const why = whyBalance({ result, units }, wing);
        return why && unlinked(why);
      }
      case 'ballast': {
        const why = wanted === null ? null : whyBallast({ result, units }, terms.arm, wanted);
        return why && unlinked(why);
      }
      case 'allUp':
        if (outcome?.ballast === undefined || outcome.ballast === null || outcome.allUp === null) return null;
        return {
          title: 'Mass all up',
          formula: `${grams(outcome.allUp)} = ${grams(outcome.bare)} + ${grams(outcome.ballast)} of ballast${added > 0 ? ` + ${grams(added)} up to the class minimum` : ''}`,
          steps: added > 0 ? ['What the class minimum still asks for lies at the balance point.'] : [],
          inputs: [
            {
              name: 'Without ballast',
              value: grams(outcome.bare),
              ask: { of: 'trial', figure: 'bare', trial, terms },
            },
            {
              name: 'Ballast',
              value: grams(outcome.ballast),
              ask: { of: 'trial', figure: 'ballast', trial, terms },
            },
          ],
          doubt: `±\u202f${units.doubt(outcome.u, 'mass', { fine: true })}, that of the parts; the ballast is weighed.`,
          source: null,
        };
      case 'wingLoading':
        return loadingBy('Wing loading', 'projected wing area', 'projected', wing?.area ?? 0);
      case 'classLoading':
        return loadingBy('Class loading', 'class area', 'class', classArea);
      case 'margin': {
        const { ballast, allUp, marginAt } = outcome ?? {};
        if (typeof allUp !== 'number' || typeof marginAt !== 'number' || wanted === null) return null;
        const weight = (id: string, mass: number, x: number): Item => ({
          id,
          name: 'Ballast',
          group: 'ballast',
          mass,
          at: [x, 0, 0],
        });
        const items = [
          ...tried.items,
          weight('trim-weight', ballast ?? 0, terms.arm),
          weight('class-weight', added, wanted),
        ];
        const trimmed = { ...tried, items };
        const why = whySpar(
          { plan: trimmed, result: estimate(trimmed), units },
          marginAt,
          plan.flight?.loadFactor ?? 1,
        );
        return why && unlinked(why);
      }
    }

    function loadingBy(title: string, name: string, kind: AreaKind, mm2: number): Why | null {
      const allUp = outcome?.allUp ?? null;
      const value = allUp === null ? null : loadingOf(allUp, mm2);
      if (allUp === null || value === null) return null;
      return {
        title,
        formula: `${loading(value)} = mass all up ÷ ${name} = ${grams(allUp)} ÷ ${area(mm2)}`,
        steps: [],
        inputs: [
          { name: 'Mass all up', value: grams(allUp), ask: { of: 'trial', figure: 'allUp', trial, terms } },
          { name: capital(name), value: area(mm2), ask: { of: 'area', kind } },
        ],
        doubt: null,
        source: null,
      };
    }
  }
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** Figures of a trial are not those of the plan that lies on the desk, so they lead to none of it. */
function unlinked(why: Why): Why {
  return { ...why, inputs: why.inputs.map(({ name, value }): WhyInput => ({ name, value })) };
}

function woodsOf({ materials }: Trial, names: ReadonlyMap<string, string>): string[] {
  const woods = Object.entries(materials).map(
    ([group, { material }]) =>
      `${group.includes('/') ? (names.get(group) ?? group) : sheetGroupName(group)} of ${material.name}`,
  );
  return woods.length === 0
    ? []
    : [`${woods.join(', ')}; all else as drawn, the plan’s own ballast left out.`];
}
