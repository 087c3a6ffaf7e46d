import { describe, expect, it } from 'vitest';
import dunlinJson from '#data/demo/gliders/dunlin.json' with { type: 'json' };
import ploverJson from '#data/demo/gliders/plover.json' with { type: 'json' };
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import { answer } from '#client/lib/why/answer.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import { whyLine } from '#client/lib/why/why-line.ts';
import { whySum } from '#client/lib/why/why-sum.ts';
import { airAt } from '#shared/core/atmosphere.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Trial } from '#shared/core/wood-trial.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS } from '#shared/format/units.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const explained = [dunlinJson, ploverJson, whimbrelJson].flatMap((json) => {
  const plan = planSchema.parse(json);
  return estimate(plan).lines.map((line) => ({ plan, line, why: whyLine(plan, line, USUAL_UNITS) }));
});
const number = (text: string | undefined) => Number(text?.replaceAll('\u202f', ''));
const FORMULA =
  /^([\d.\u202f]+)\u202fg = ([\d.\u202f]+)\u202fcm([²³])(?: of joints)? × ([\d.\u202f]+)\u202f(?:kg\/m³|g\/m²)$/;

describe('whyLine', () => {
  it('multiplies to the mass that it explains, for every part that has a measure', () => {
    const formulas = explained.filter(({ why }) => why.formula.includes('×'));
    expect(formulas.length).toBeGreaterThan(60);
    for (const { line, why } of formulas) {
      const [, mass, measure, power, figure] = FORMULA.exec(why.formula) ?? [];
      const product = number(measure) * number(figure) * (power === '³' ? 1e-3 : 1e-4);
      // Both sides are printed: to 0.005 g, 0.005 cm³ or 0.05 cm², and half a unit of the material's figure.
      const room =
        0.006 + 0.006 * number(figure) * 1e-3 + (power === '³' ? 0.5 : 0.05) * (line.mass / number(figure));
      expect(Math.abs(product - line.mass), `${line.id}: ${why.formula}`).toBeLessThan(room);
      expect(Math.abs(number(mass) - line.mass)).toBeLessThan(0.0051);
    }
  });

  it('has steps and a doubt for every line, and a source for every material', () => {
    for (const { line, why } of explained) {
      expect(why.steps.length, line.id).toBeGreaterThan(line.material === null ? 0 : 1);
      expect(why.doubt, line.id).toBeTruthy();
      expect(why.source === null, line.id).toBe(line.material === null);
    }
  });
});

describe('whySum', () => {
  it('divides moment by mass', () => {
    const lines = explained.slice(0, 3).map(({ line }) => line);
    const arm = lines.reduce((s, l) => s + l.moment, 0) / lines.reduce((s, l) => s + l.mass, 0);
    expect(whySum('All', lines, USUAL_UNITS).steps[0]).toContain(`= ${arm.toFixed(1)}\u202fmm`);
  });
});

describe('every figure that can be asked', () => {
  const kinds = ['projected', 'developed', 'class'] as const;
  const planformFigures = [
    'areaProjected',
    'areaDeveloped',
    'span',
    'aspectRatio',
    'mac',
    'xLeMac',
    'yMac',
  ] as const;
  const trialFigures = [
    'wingBare',
    'wingMass',
    'bare',
    'percentMac',
    'ballast',
    'allUp',
    'wingLoading',
    'classLoading',
    'margin',
  ] as const;
  const plan = planSchema.parse(dunlinJson);
  const result = estimate(plan);
  const air = airAt(0, 15);
  const terms = { arm: -132, minimumMass: 300 };
  const lead: Trial = { name: 'As drawn', materials: {} };
  const questions: WhyQuestion[] = [
    ...result.lines.map(({ id }): WhyQuestion => ({ of: 'line', id })),
    { of: 'group', key: 'wing' },
    ...(['total', 'balance', 'neutralPoint', 'staticMargin', 'chord'] as const).map((of): WhyQuestion => ({
      of,
    })),
    ...planformFigures.map((figure): WhyQuestion => ({ of: 'planform', surface: 'tailplane', figure })),
    ...kinds.flatMap((kind): WhyQuestion[] => [
      { of: 'area', kind },
      { of: 'loading', kind },
    ]),
    { of: 'speed', lift: 1, density: air.density },
    { of: 'reynolds', lift: 1, ...air },
    { of: 'air', altitude: 300, temperature: 25 },
    { of: 'ballast', arm: -132, to: 60 },
    { of: 'spar', station: result.spar.worst ?? -1, loadFactor: 6 },
    ...trialFigures.map((figure): WhyQuestion => ({ of: 'trial', figure, trial: lead, terms })),
    ...(['bare', 'allUp'] as const).map((figure): WhyQuestion => ({
      of: 'saving',
      figure,
      from: lead,
      to: { name: 'Light', materials: {} },
      terms,
    })),
  ];
  const told = (question: WhyQuestion, units = USUAL_UNITS) => answer(question, { plan, result, units });

  it('has an answer with a title and a formula, in inches too', () => {
    for (const question of questions) {
      for (const units of [USUAL_UNITS, unitsOf(INCH_CHOICES)]) {
        const why = told(question, units);
        expect(why?.title, JSON.stringify(question)).toBeTruthy();
        expect(why?.formula, JSON.stringify(question)).toMatch(/^.+ (=|as entered)/);
        expect(JSON.stringify(why)).not.toMatch(/NaN|undefined|Infinity/);
      }
    }
  });

  it('leads on only to answers and to lines that there are', () => {
    const lines = new Set(result.lines.map(({ id }) => id));
    let asked = 0;
    for (const question of questions) {
      for (const { ask, at } of told(question)?.inputs ?? []) {
        if (ask) asked += 1;
        if (ask) expect(told(ask), JSON.stringify(ask)).not.toBeNull();
        if (at?.line !== undefined) expect(lines).toContain(at.line);
      }
    }
    expect(asked).toBeGreaterThan(30);
  });

  it('works out to the figure that it explains: loadings, areas, margin', () => {
    const parts = (question: WhyQuestion) =>
      (
        told(question)
          ?.formula.replaceAll('\u202f', '')
          .match(/[\d.]+(?=g\/dm²|g |g$|dm²|mm|%)/g) ?? []
      ).map(Number);
    for (const kind of kinds) {
      const [loading = 0, mass = 0, area = 1] = parts({ of: 'loading', kind });
      expect(Math.abs(loading - mass / area), kind).toBeLessThan(0.02);
    }
    const [margin = 0, neutral = 0, x = 0, mac = 1] = parts({ of: 'staticMargin' });
    expect(Math.abs(margin - (100 * (neutral - x)) / mac)).toBeLessThan(0.15);
    const [ballast = 0, whole = 0, from = 0, to = 0, , arm = 0] = parts({ of: 'ballast', arm: -132, to: 60 });
    expect(Math.abs(ballast - (whole * (from - to)) / (to + arm))).toBeLessThan(0.2);
  });

  it('has none where the plan has changed under it', () => {
    expect(told({ of: 'line', id: 'wing/gone' })).toBeNull();
    expect(told({ of: 'planform', surface: 'gone', figure: 'mac' })).toBeNull();
    const bare = { ...plan, surfaces: plan.surfaces.filter(({ role }) => role === 'wing') };
    expect(
      answer({ of: 'staticMargin' }, { plan: bare, result: estimate(bare), units: USUAL_UNITS }),
    ).toBeNull();
  });
});
