import { describe, expect, it } from 'vitest';
import { cuttableLines } from '#client/features/trial/draws/cuttable-lines.ts';
import { USUAL_SETTINGS } from '#client/features/trial/draws/settings.ts';
import { workOut, type Figures } from '#client/features/trial/draws/tasks.ts';
import {
  agreementSentence,
  chanceText,
  drawsHeadline,
  sharesSentence,
  targetSentence,
} from '#client/features/trial/draws/words.ts';
import { summaryOf } from '#shared/core/draws-summary.ts';
import type { Plan } from '#shared/core/plan.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan, planOf } from '#tests/support/plans.ts';

const plain = (text: string) => text.replaceAll('\u202f', ' ');

function figuresOf(plan: Plan, draws = 2_000): Figures {
  const steps = workOut({ of: 'figures', plan, settings: { ...USUAL_SETTINGS, draws } });
  let step = steps.next();
  while (step.done !== true) step = steps.next();
  return step.value;
}
const dunlin = demoPlan('dunlin');
const figures = figuresOf(dunlin);
/** Of 21 draws one twentieth is exactly one. */
const even = (from: number, step: number) => summaryOf(Array.from({ length: 21 }, (_, i) => from + i * step));

describe('the headline of the draws', () => {
  it('says where nine in ten lie', () => {
    const told = { ...figures, mass: even(390, 2), percentMac: even(38, 0.1) };
    expect(plain(drawsHeadline(told, USUAL_UNITS))).toBe(
      'All-up mass lies between 392.0 and 428.0 g nine times in ten; balance 38.1–39.9 % MAC',
    );
    expect(plain(drawsHeadline(told, unitsOf(INCH_CHOICES)))).toContain('between 13.83 and 15.10 oz');
  });

  it('tells the balance from the datum where there is no wing', () => {
    const told = { ...figures, mass: even(390, 2), x: even(70, 1), percentMac: null };
    expect(plain(drawsHeadline(told, USUAL_UNITS))).toMatch(/; balance 71\.0–89\.0 mm from the datum$/);
  });

  it('gives one figure where all draws print the same', () => {
    const told = { ...figures, mass: even(390, 0), percentMac: even(38, 0) };
    expect(plain(drawsHeadline(told, USUAL_UNITS))).toBe(
      'All-up mass is 390.0 g nine times in ten; balance at 38.0 % MAC',
    );
  });

  it('says that there is nothing to draw', () => {
    expect(drawsHeadline(figuresOf(planOf([])), USUAL_UNITS)).toBe('Nothing to draw: the plan has no mass');
  });
});

describe('a chance', () => {
  it.each([
    [1, 'over 99.9 %'],
    [0.9996, 'over 99.9 %'],
    [0.834, '83 %'],
    [0.0002, 'under 0.1 %'],
    [0, 'under 0.1 %'],
  ])('of %f is told as %s', (share, text) => {
    expect(plain(chanceText({ share, standardError: 0.003 }))).toBe(text);
  });

  it('is told finer where many draws allow it', () => {
    expect(plain(chanceText({ share: 0.8344, standardError: 0.0004 }))).toBe('83.4 %');
  });

  it('of balancing as wanted names the range, and is left out without one', () => {
    expect(plain(targetSentence(figures, dunlin))).toMatch(/wanted 52\.0 ± 2\.0 % MAC .*: \d\d %\.$/);
    expect(targetSentence({ ...figures, onTarget: null }, {})).toBe('');
  });
});

describe('the agreement with the sum of squares', () => {
  const agreement = (drawn: number, firstOrder: number) => ({
    drawn,
    firstOrder,
    apart: firstOrder > 0 ? drawn / firstOrder - 1 : null,
    bySampling: 0.005,
  });
  const told = (mass: ReturnType<typeof agreement>) =>
    plain(
      agreementSentence({ ...figures, draws: 20_000, agreement: { mass, x: agreement(1, 1) } }, USUAL_UNITS),
    );

  it('holds as far as chance goes', () => {
    expect(told(agreement(4.04, 4))).toBe(
      'The draws agree with the sum of squares: ± 4.04 drawn and 4.00 g to first order for the mass, ' +
        '± 1.00 drawn and 1.00 mm to first order for the balance; at most 1.0 % apart, where 20 000 draws are good to 0.5 %.',
    );
  });

  it('does not where it is past chance', () => {
    expect(told(agreement(4.4, 4))).toMatch(/differ: .*up to 10\.0 % apart, .*trust the draws\.$/);
  });

  it('has nothing to say where nothing scatters', () => {
    expect(told(agreement(0, 0))).not.toMatch(/NaN|Infinity/);
  });
});

describe('the shares of the variance', () => {
  it('name the material that makes most, and what helps', () => {
    expect(plain(sharesSentence(figures.shares, dunlin))).toMatch(
      /^Balsa, medium makes \d\d % of the variance of the mass and \d\d % of that of the balance; weigh what is cut from it first\./,
    );
    expect(sharesSentence([], dunlin)).toBe('Nothing in the plan is in doubt.');
  });
});

describe('what may be cut from one piece', () => {
  it('is every part of wood, and neither glue nor covering', () => {
    const lines = cuttableLines(dunlin);
    expect(lines.length).toBeGreaterThan(5);
    const known = new Map(
      dunlin.surfaces.flatMap(({ key, parts }) => parts.map((p) => [`${key}/${p.id}`, p.kind])),
    );
    expect(lines.filter(({ id }) => ['glue', 'covering', 'finish'].includes(known.get(id) ?? ''))).toEqual(
      [],
    );
    expect(new Set(lines.map(({ id }) => id)).size).toBe(lines.length);
  });
});
