import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import type { Part } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { differences } from './compare.ts';
import { built, pair, ribs, SMALL, whole } from './framework.ts';
import { part, plan, sheetTail, strip } from './stock.ts';
import { secondOpinion } from './second-opinion.ts';

const of = (name: string, parts: Part[]) => plan(name, [built(parts), sheetTail]);
const joints = part('glue', { id: 'joints', material: 'glue', method: 'joints' });
const skin = part('skin', { id: 'skin', ...whole, start: 0.1, end: 0.3, seat: 'top', thickness: 1 });
const topSpar = strip('spar', [0, 520], 'top', [0.27, 0.27], SMALL);
const TALL: Parameters<typeof strip>[4] = [
  [6, 6],
  [20, 2],
];
const cases = [
  of('span with a tip block on one side', [
    ribs,
    part('tipBlock', { id: 'tip', side: 'port', length: 26, hollow: 0 }),
  ]),
  of('centroid of a web under one spar', [
    ribs,
    topSpar,
    part('web', { id: 'web', ...whole, at: [0.27, 0.27], thickness: 1 }),
  ]),
  of('centroid of a web under one skin', [
    ribs,
    skin,
    part('web', { id: 'web', ...whole, at: [0.2, 0.2], thickness: 1 }),
  ]),
  of('covering over the tip block', [
    part('tipBlock', { id: 'tip', length: 34, hollow: 0 }),
    part('covering', { id: 'tissue', material: 'tissue', from: 480, to: 520, seat: 'both', overlap: 0 }),
  ]),
  of('joints of a strip that leaves its skin on the way', [
    strip('s', [0, 520], 'top', [0.22, 0.4], SMALL),
    skin,
    joints,
  ]),
  of('web that leaves its spars on the way', [
    ribs,
    ...pair('spar', 520, [0.3, 0.3], SMALL),
    part('web', { id: 'web', ...whole, at: [0.3, 0.36], thickness: 1 }),
  ]),
  of('web whose height ends on the way', [
    strip('s', [0, 520], 'middle', [0.3, 0.3], TALL),
    part('web', { id: 'web', ...whole, at: [0.3, 0.3], thickness: 1 }),
  ]),
];

/** Cases where a sample rule or a symmetric thought goes wrong: what jumps along the span, what is on one side only. */
describe('second opinion on jumps and one-sided parts', () => {
  it.each(cases.map((one) => [one.name, one] as const))(
    'agrees with the estimate on every figure: %s',
    (_name, one) => {
      expect(planSchema.safeParse(one).error).toBeUndefined();
      expect(differences(estimate(one), secondOpinion(one))).toEqual([]);
    },
  );
});
