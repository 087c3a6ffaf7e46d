import { describe, expect, it } from 'vitest';
import dunlinJson from '#data/demo/gliders/dunlin.json' with { type: 'json' };
import ploverJson from '#data/demo/gliders/plover.json' with { type: 'json' };
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import { whyLine, whySum } from '#client/features/balance/why.ts';
import { estimate } from '#shared/core/estimate.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const asked = [dunlinJson, ploverJson, whimbrelJson].flatMap((json) => {
  const plan = planSchema.parse(json);
  return estimate(plan).lines.map((line) => ({ plan, line, why: whyLine(plan, line, USUAL_UNITS) }));
});
const number = (text: string | undefined) => Number(text?.replaceAll('\u202f', ''));
const FORMULA =
  /^([\d.\u202f]+)\u202fg = ([\d.\u202f]+)\u202fcm([²³]) × ([\d.\u202f]+)\u202f(?:kg\/m³|g\/m²)$/;

describe('whyLine', () => {
  it('multiplies to the mass that it explains, for every part that has a measure', () => {
    const formulas = asked.filter(({ why }) => why.formula.includes('×'));
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
    for (const { line, why } of asked) {
      expect(why.steps.length, line.id).toBeGreaterThan(line.material === null ? 0 : 1);
      expect(why.doubt, line.id).toBeTruthy();
      expect(why.source === null, line.id).toBe(line.material === null);
    }
  });
});

describe('whySum', () => {
  it('divides moment by mass', () => {
    const lines = asked.slice(0, 3).map(({ line }) => line);
    const arm = lines.reduce((s, l) => s + l.moment, 0) / lines.reduce((s, l) => s + l.mass, 0);
    expect(whySum(lines, USUAL_UNITS).steps[0]).toContain(`= ${arm.toFixed(1)}\u202fmm`);
  });
});
