import { describe, expect, it } from 'vitest';
import type { Part } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { lineOf } from '#tests/support/plans.ts';
import { boxWing, part, strip } from './box-wing.ts';

const ribs: Part = { ...part, id: 'ribs', kind: 'ribs', stations: [100, 400], thickness: 2, lightening: 0 };
const joints: Part = { ...part, id: 'glue', material: 'glue', kind: 'glue', method: 'joints', layers: 1 };
const glueArea = (...parts: Part[]) => lineOf(boxWing([...parts, joints]), 'wing/glue').area;

describe('glue in the joints', () => {
  it('wets three sides of a let-in strip and one side of a strip on the surface, at each rib', () => {
    expectNearly(glueArea(ribs, strip()), 2 * (6 + 2 * 3) * 2, ROUNDING);
    expectNearly(glueArea(ribs, strip({ letIn: false })), 2 * 6 * 2, ROUNDING);
  });

  it('wets a rib’s end on a nose or tail strip, no higher than either', () => {
    expectNearly(glueArea(ribs, strip({ seat: 'nose', height: [8, 8] })), 2 * 8 * 2, ROUNDING);
    expectNearly(glueArea(ribs, strip({ seat: 'tail', height: [30, 30] })), 2 * 12 * 2, ROUNDING);
  });

  it('wets a rib’s edge under a skin, and a strip’s face under a skin over it', () => {
    const skin: Part = {
      ...part,
      id: 'skin',
      kind: 'skin',
      from: 0,
      to: 500,
      start: 0,
      end: 0.4,
      seat: 'top',
      thickness: 1,
    };
    expectNearly(glueArea(ribs, skin), 2 * 80 * 2, ROUNDING);
    expectNearly(glueArea(skin, strip()), 6 * 500, ROUNDING);
    expectNearly(glueArea(skin, strip({ seat: 'bottom' })), 0, ROUNDING);
  });

  it('wets the last section under a tip block', () => {
    expectNearly(glueArea({ ...part, id: 'tip', kind: 'tipBlock', length: 30, hollow: 0 }), 2400, ROUNDING);
  });

  it('weighs its area times spread and layers', () => {
    const glue: Part = { ...joints, layers: 2 };
    const line = lineOf(boxWing([ribs, strip(), glue]), 'wing/glue');
    expectNearly(line.mass, (2 * 48 * 80) / 1e6, ROUNDING);
  });
});

describe('glue by share', () => {
  it('is that share of the wood, where the wood is', () => {
    const glue: Part = { ...part, id: 'glue', material: 'glue', kind: 'glue', method: 'share', share: 0.05 };
    const result = boxWing([glue, ribs, { ...ribs, id: 'hard', material: 'hard', stations: [400] }]);
    const wood = lineOf(result, 'wing/ribs').mass + lineOf(result, 'wing/hard').mass;
    expectNearly(lineOf(result, 'wing/glue').mass, 0.05 * wood, ROUNDING);
    // 2 ribs of one weight at 250 on average and one of twice the density at 400.
    expectNearly(lineOf(result, 'wing/glue').at[1], (100 + 400 + 2 * 400) / 4, ROUNDING);
  });

  it('of no wood is told', () => {
    const glue: Part = { ...part, id: 'glue', material: 'glue', kind: 'glue', method: 'share', share: 0.05 };
    expect(boxWing([glue]).notices.map((n) => n.code)).toContain('share_of_no_wood');
  });
});
