import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ribsAround, spliceOf, type Splice } from '#shared/core/cut/splice.ts';

const INCH = 25.4;
const spliced = (answer: ReturnType<typeof spliceOf>): Splice => {
  if ('refused' in answer) throw new Error(answer.refused);
  return answer;
};

describe('a half wing of 31 in with 12 ribs (common practice, no source)', () => {
  const span = 31 * INCH;
  const bay = span / 11;
  const ribs = Array.from({ length: 12 }, (_, i) => i * bay);
  const spar = { length: span, thickness: INCH / 8, from: 0, halfSpan: span };

  it('needs no splice from stock of 36 in', () => {
    expect(spliced(spliceOf(spar, { stock: 36 * INCH, slope: 8, turn: 0 })).joints).toEqual([]);
  });

  it('asks for one, outside the inner third, from stock that is one rib bay short, and says where', () => {
    const stock = span - bay;
    const joints = ([0, 1, 2, 3] as const).map((turn) => {
      const { joints: of, scarf, pieces } = spliced(spliceOf(spar, { stock, slope: 8, turn }));
      expect(scarf).toBeCloseTo(INCH, 9);
      expect(of).toHaveLength(1);
      expect(Math.max(...pieces)).toBeLessThanOrEqual(stock + 1e-9);
      return of[0] ?? 0;
    });
    // As far out as the stock reaches: half a scarf inside rib 11, between it and rib 10.
    expect(joints[0]).toBeCloseTo(stock - INCH / 2, 9);
    expect(ribsAround(ribs, joints[0] ?? 0)).toEqual([10, 11]);
    expect(Math.min(...joints)).toBeGreaterThan(span / 3);
    const apart = joints.slice(1).map((joint, i) => (joints[i] ?? 0) - joint);
    expect(apart.every((gap) => Math.abs(gap - 2 * INCH) < 1e-9)).toBe(true);
  });
});

describe('a splice', () => {
  const long = fc.record({
    length: fc.double({ min: 100, max: 4000, noNaN: true }),
    thickness: fc.double({ min: 1, max: 8, noNaN: true }),
    stock: fc.double({ min: 200, max: 1500, noNaN: true }),
    turn: fc.constantFrom(0 as const, 1 as const, 2 as const, 3 as const),
  });

  it('comes to the stick’s length, fits its stock, and stays out of the inner third', () => {
    fc.assert(
      fc.property(long, ({ length, thickness, stock, turn }) => {
        const answer = spliceOf({ length, thickness, from: 0, halfSpan: length }, { stock, slope: 8, turn });
        if ('refused' in answer) {
          expect(answer.by).toBeGreaterThan(0);
          return;
        }
        const { joints, pieces, scarf } = answer;
        const sum = pieces.reduce((total, piece) => total + piece, 0);
        expect(sum - joints.length * scarf).toBeCloseTo(length, 6);
        for (const piece of pieces) expect(piece).toBeLessThanOrEqual(stock + 1e-6);
        for (const joint of joints) expect(joint - scarf / 2).toBeGreaterThanOrEqual(length / 3 - 1e-6);
      }),
    );
  });

  it('says how much longer the stock would have to be', () => {
    const stick = { length: 1500, thickness: 5, from: 0, halfSpan: 1500 };
    const terms = { slope: 8, turn: 0 } as const;
    const answer = spliceOf(stick, { ...terms, stock: 400 });
    expect(answer).toEqual({ refused: 'joint_in_inner_third', by: 140 });
    expect('refused' in spliceOf(stick, { ...terms, stock: 540 })).toBe(false);
    expect(spliceOf(stick, { ...terms, stock: 30 })).toEqual({ refused: 'stock_shorter_than_scarf', by: 10 });
  });
});
