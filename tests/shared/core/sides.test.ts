import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import type { Part } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING, SAMPLED } from '#tests/support/nearly.ts';
import { lineOf, planOf, wingOf } from '#tests/support/plans.ts';

describe('port and starboard', () => {
  it('halves of different wood put the balance on the heavier side', () => {
    const skin = (id: string, side: 'port' | 'starboard', material: string): Part => ({
      id,
      name: id,
      kind: 'skin',
      material,
      side,
      from: 0,
      to: 500,
      start: 0.3,
      end: 0.3,
      seat: 'wrap',
      thickness: 1,
    });
    const result = estimate(planOf([wingOf([skin('p', 'port', 'hard'), skin('s', 'starboard', 'balsa')])]));
    // Both halves have their centre at 250 mm; masses 2 to 1: y = (250 − 2·250)/3.
    expectNearly(result.totals.at?.[1], -250 / 3, ROUNDING);
    expectNearly(lineOf(result, 'wing/p').mass, 2 * lineOf(result, 'wing/s').mass, ROUNDING);
    expectNearly(lineOf(result, 'wing/p').at[1], -250, ROUNDING);
  });

  it('a spar let in on one side notches the ribs of that side only', () => {
    const ribs: Part = {
      id: 'ribs',
      name: 'Ribs',
      kind: 'ribs',
      material: 'balsa',
      stations: [100, 200],
      thickness: 2,
      lightening: 0,
    };
    const spar: Part = {
      id: 'spar',
      name: 'Spar',
      kind: 'strip',
      material: 'balsa',
      side: 'port',
      from: 0,
      to: 500,
      at: [0.3, 0.3],
      seat: 'top',
      width: [6, 6],
      height: [3, 3],
      profile: 'rectangle',
      letIn: true,
    };
    const bare = lineOf(estimate(planOf([wingOf([ribs])])), 'wing/ribs');
    const notched = lineOf(estimate(planOf([wingOf([ribs, spar])])), 'wing/ribs');
    // Two port ribs lose 6 × 3 mm of 2 mm wood each.
    expectNearly((bare.volume ?? 0) - (notched.volume ?? 0), 2 * 6 * 3 * 2, SAMPLED);
    expect(notched.at[1]).toBeGreaterThan(0);
  });
});
