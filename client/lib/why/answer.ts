import { sheetGroupKey, sheetGroupName } from '#shared/core/sheet-groups.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import type { WhyQuestion } from './question.ts';
import { whyBalance } from './why-balance.ts';
import { whyBallast, whyTipWeight } from './why-ballast.ts';
import { whyLine } from './why-line.ts';
import { whyAir, whyArea, whyLoading, whyReynolds, whySpeed } from './why-loading.ts';
import { whyNeutralPoint, whyStaticMargin } from './why-neutral.ts';
import { whyChord, whyPlanform } from './why-planform.ts';
import { whySpar } from './why-spar.ts';
import { whySum } from './why-sum.ts';
import { whySaving } from './why-saving.ts';
import { whyTrial } from './why-trial.ts';
import { percent, sayIn } from './say.ts';
import type { Asked, Why } from './why.ts';

/** How a figure was made; null where it is not there (any more). */
export function answer(question: WhyQuestion, asked: Asked): Why | null {
  const { plan, result, units } = asked;
  switch (question.of) {
    case 'line': {
      const line = result.lines.find(({ id }) => id === question.id);
      return line ? withShare(whyLine(plan, line, units), line.mass, asked) : null;
    }
    case 'group': {
      const lines = result.lines.filter((line) => sheetGroupKey(line) === question.key);
      if (lines.length === 0) return null;
      const mass = lines.reduce((sum, line) => sum + line.mass, 0);
      return withShare(whySum(sheetGroupName(question.key), lines, units), mass, asked);
    }
    case 'total':
      return whySum('The whole model', result.lines, units);
    case 'balance':
      return whyBalance(asked, wingReference(plan));
    case 'neutralPoint':
      return whyNeutralPoint(asked);
    case 'staticMargin':
      return whyStaticMargin(asked);
    case 'chord':
      return whyChord(asked);
    case 'planform':
      return whyPlanform(asked, question.surface, question.figure);
    case 'area':
      return whyArea(asked, question.kind);
    case 'loading':
      return whyLoading(asked, question.kind);
    case 'speed':
      return whySpeed(asked, question.lift, question.density);
    case 'reynolds':
      return whyReynolds(asked, question.lift, question.density, question.viscosity);
    case 'air':
      return whyAir(asked, question.altitude, question.temperature);
    case 'ballast':
      return whyBallast(asked, question.arm, question.to);
    case 'tipWeight':
      return whyTipWeight(asked, question.arm);
    case 'spar':
      return whySpar(asked, question.station, question.loadFactor);
    case 'trial':
      return whyTrial(asked, question.figure, question.trial, question.terms);
    case 'saving':
      return whySaving(asked, question);
  }
}

/** With what a part's mass is of the whole model's. */
function withShare(why: Why, mass: number, { result, units }: Asked): Why {
  const { grams } = sayIn(units);
  const whole = result.totals.mass;
  if (!(whole > 0)) return why;
  const share = `Share of the mass: ${grams(mass)} ÷ ${grams(whole)} = ${percent((100 * mass) / whole)}.`;
  return { ...why, steps: [...why.steps, share] };
}
