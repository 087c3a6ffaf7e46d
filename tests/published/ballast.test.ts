import { describe, expect, test } from 'vitest';
import reference from '#data/reference/ballast.json';
import { balancePoint } from '#shared/core/balance.ts';
import { balanceAfter, ballastFor, massToShift, shiftOf } from '#shared/core/ballast.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

const massOf = (answer: ReturnType<typeof ballastFor>) => ('mass' in answer ? answer.mass : Number.NaN);

describe('ballast at an arm', () => {
  test.each(reference.ballast)('$id needs $ballast.printed ($source)', ({ mass, from, to, at, ballast }) => {
    const needed = massOf(ballastFor(mass, from, to, at));
    expectPrinted(needed, ballast.printed, ballast.decimals);
    expectNear(balanceAfter(mass, from, needed, at), to, SAME_SUM);
  });

  test.each(reference.ballast)(
    '$id: from the other side it is refused, and told what would have to come off',
    (row) => {
      const otherSide = 2 * row.to - row.at;
      const answer = ballastFor(row.mass, row.from, row.to, otherSide);
      expect(answer).toMatchObject({ refused: 'wrong_side' });
      const takeOff = 'takeOff' in answer ? (answer.takeOff ?? Number.NaN) : Number.NaN;
      expectNear(balanceAfter(row.mass, row.from, -takeOff, otherSide), row.to, SAME_SUM);
    },
  );
});

describe('weight carried from one place to another', () => {
  test.each(reference.shifts)('$id moves the balance point by $shift.printed ($source)', (row) => {
    const distance = row.to - row.from;
    const shift = shiftOf(row.moved, row.total, distance);
    expectPrinted(shift, row.shift.printed, row.shift.decimals);
    const after = row.momentBefore / row.total + shift;
    expectPrinted(after, row.balance.printed, row.balance.decimals);
    expectNear(after * row.total, row.momentAfter, SAME_SUM);
  });

  test.each(reference.massToShift)('$id: $mass.printed has to be carried ($source)', (row) => {
    const needed = massToShift(row.total, row.by, row.distance);
    expectPrinted(needed, row.mass.printed, row.mass.decimals);
    expectNear(shiftOf(needed ?? Number.NaN, row.total, row.distance), row.by, SAME_SUM);
  });
});

describe('side to side', () => {
  test('a heavier port half takes weight at the starboard tip, until nothing is left over', () => {
    const { halves, moment, tipAt, ballast } = reference.lateral;
    const mass = halves.reduce((sum, half) => sum + half.mass, 0);
    const y =
      balancePoint(halves.map((half) => ({ mass: half.mass, at: [0, half.at, 0] })))?.[1] ?? Number.NaN;
    expectPrinted(y * mass, moment, 1);
    const tipWeight = massOf(ballastFor(mass, y, 0, tipAt));
    expectPrinted(tipWeight, ballast.printed, ballast.decimals);
    expect(Math.abs(balanceAfter(mass, y, tipWeight, tipAt))).toBeLessThan(1e-12);
  });
});
