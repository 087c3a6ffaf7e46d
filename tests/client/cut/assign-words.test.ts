import { describe, expect, it } from 'vitest';
import { measuredWoods } from '#client/features/cut/assign/densities.ts';
import { choiceOf, entriesOf, stockAtHand } from '#client/features/cut/assign/problem.ts';
import { missWords, nearWords } from '#client/features/cut/assign/words.ts';
import { EXAMPLE_ASSIGNMENT, EXAMPLE_PLAN } from '#shared/core/example-wing.ts';
import { unitsOf } from '#shared/format/units.ts';

const units = unitsOf({});
const plain = (text: string) => text.replaceAll('\u202f', ' ');
const PIECE = {
  id: '1',
  number: 7,
  kind: 'sheet',
  material: { key: 'balsa-light', name: 'Balsa, light', category: 'wood' },
  length: 300,
  width: 75,
  thickness: 2,
  density: 100,
  grainCut: 'C',
} as const;

describe('the assignment in words', () => {
  it('says how near an answer is by parts first, then as a share', () => {
    const account = { score: 20_030, bought: ['a', 'b'] };
    expect(nearWords(10_020, account, units)).toBe('at best 1 more part would find a place');
    expect(plain(nearWords(0.3, account, units))).toBe('at most 1.0 % from the best');
    expect(nearWords(0, account, units)).toBe('no other way is better');
  });

  it('says why a part cannot be cut from a piece', () => {
    expect(plain(missWords({ code: 'too_short', by: 12 }, units))).toBe('12.0 mm too short');
    expect(missWords({ code: 'other_grain' }, units)).toBe('sawn the wrong way for it');
  });
});

describe('what is kept of an assignment', () => {
  it('comes back as it was, without pieces that are gone', () => {
    const choice = new Map([
      ['rib port', '1'],
      ['rib starboard', '2'],
    ]);
    const fixed = new Set(['rib starboard']);
    const entries = entriesOf(EXAMPLE_ASSIGNMENT, choice, fixed);
    expect(entries.map(({ pieceId, at }) => [pieceId, at])).toEqual([
      ['1', [0, 0]],
      ['2', [0, 0]],
    ]);
    expect(choiceOf(entries, EXAMPLE_ASSIGNMENT)).toEqual({ choice, fixed });
    const without = { ...EXAMPLE_ASSIGNMENT, stock: EXAMPLE_ASSIGNMENT.stock.slice(0, 1) };
    expect([...choiceOf(entries, without).choice]).toEqual([['rib port', '1']]);
  });

  it('takes weighed sheets and sticks of wood, and nothing else', () => {
    const pieces = [
      PIECE,
      { ...PIECE, id: '2', density: null },
      { ...PIECE, id: '3', kind: 'tube' } as const,
    ];
    expect(stockAtHand(pieces).map(({ id, wood }) => [id, wood])).toEqual([['1', 'balsa']]);
  });

  it('writes into the drawing what the pieces of a line come to together', () => {
    const choice = new Map([
      ['rib port', '1'],
      ['rib starboard', '2'],
    ]);
    const pieces = [PIECE, { ...PIECE, id: '2', number: 9 }];
    const woods = measuredWoods(EXAMPLE_PLAN, EXAMPLE_ASSIGNMENT, choice, pieces);
    // Half of it of 100 and half of 140 kg/m³.
    expect(woods['wing/rib']).toMatchObject({ key: 'rack-7-9', material: { cv: 0.02 } });
    expect(woods['wing/rib']?.material.density).toBeCloseTo(120, 9);
    expect(woods['wing/rib']?.material.name).toMatch(/^No\. 7, 9, /);
    expect(measuredWoods(EXAMPLE_PLAN, EXAMPLE_ASSIGNMENT, new Map(), pieces)).toEqual({});
  });
});
