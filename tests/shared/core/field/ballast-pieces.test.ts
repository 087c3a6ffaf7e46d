import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ballastFor } from '#shared/core/ballast.ts';
import { chooseBallast, type BallastPiece, type BallastWish } from '#shared/core/field/ballast-pieces.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

const wish: BallastWish = {
  mass: 120,
  x: 82,
  at: -60,
  range: { from: 74, to: 76, aim: 75 },
  least: null,
  most: null,
  room: null,
};
const piece = (id: string, mass: number, divisible = false): BallastPiece => ({ id, mass, divisible });
const chosen = (answer: ReturnType<typeof chooseBallast>) => {
  if ('refused' in answer) throw new Error(answer.refused);
  return answer;
};

describe('ballast from the pieces at hand', () => {
  it('with putty is what the balance equation asks for', () => {
    const needed = ballastFor(120, 82, 75, -60);
    const answer = chosen(chooseBallast([piece('putty', 50, true)], wish));
    expectNearly(answer.ballast, 'mass' in needed ? needed.mass : Number.NaN, ROUNDING);
    expectNearly(answer.x, 75, ROUNDING);
  });

  it('takes the set that comes nearest to the aim, and fills up with putty', () => {
    const shot = [piece('a', 5), piece('b', 3), piece('c', 2.5), piece('d', 1)];
    // 6.22 g are wanted: 5 + 1 is nearer than 3 + 2.5 + 1 = 6.5.
    expect(chosen(chooseBallast(shot, wish)).pieces.map(({ id }) => id)).toEqual(['a', 'd']);
    const filled = chosen(chooseBallast([...shot, piece('putty', 1, true)], wish));
    expectNearly(filled.x, 75, ROUNDING);
  });

  it('is as good as the best of all sets, found by trying each', () => {
    const masses = fc.array(fc.double({ min: 0.2, max: 8, noNaN: true }), { minLength: 1, maxLength: 7 });
    fc.assert(
      fc.property(masses, (list) => {
        const answer = chooseBallast(
          list.map((mass, i) => piece(`${i}`, mass)),
          wish,
        );
        const sums = Array.from({ length: 2 ** list.length }, (_, set) =>
          list.reduce((sum, mass, i) => (set & (2 ** i) ? sum + mass : sum), 0),
        );
        const xOf = (mass: number) => (120 * 82 - 60 * mass) / (120 + mass);
        const fitting = sums.filter((sum) => xOf(sum) >= 74 - 1e-9 && xOf(sum) <= 76 + 1e-9);
        if ('refused' in answer) {
          expect(fitting).toEqual([]);
          return;
        }
        const best = Math.min(...fitting.map((sum) => Math.abs(sum - (120 * 7) / 135)));
        expectNearly(Math.abs(answer.ballast - (120 * 7) / 135), best, ROUNDING);
        expect(answer.x).toBeGreaterThanOrEqual(74 - 1e-9);
        expect(answer.x).toBeLessThanOrEqual(76 + 1e-9);
      }),
    );
  });

  it('puts nothing in where the balance is right already', () => {
    expect(chosen(chooseBallast([piece('a', 5)], { ...wish, x: 75 }))).toMatchObject({ pieces: [], x: 75 });
  });

  it('fills a class minimum as far as the range allows, and says what belongs at the balance point', () => {
    const answer = chosen(chooseBallast([piece('putty', 40, true)], { ...wish, least: 140 }));
    expectNearly(answer.x, 74, ROUNDING);
    expectNearly(answer.mass + answer.missing, 140, ROUNDING);
    expect(answer.missing).toBeGreaterThan(0);
  });

  it('says why nothing does it, and by how much', () => {
    const refusal = (changes: Partial<BallastWish>, pieces = [piece('putty', 50, true)]) =>
      chooseBallast(pieces, { ...wish, ...changes });
    expect(refusal({ at: 200 })).toEqual({ refused: 'wrong_place' });
    expect(refusal({ at: 82 })).toEqual({ refused: 'wrong_place' });
    expect(refusal({ room: 4 })).toMatchObject({ refused: 'no_room' });
    expect(refusal({ most: 123 })).toMatchObject({ refused: 'too_heavy' });
    expect(refusal({ most: 110, x: 75 })).toEqual({ refused: 'too_heavy', over: 10 });
    expect(refusal({}, [piece('a', 2)])).toMatchObject({ refused: 'too_little' });
    expect(refusal({}, [piece('a', 4), piece('b', 9)])).toMatchObject({
      refused: 'no_sum',
      below: 4,
      above: 9,
    });
  });
});
