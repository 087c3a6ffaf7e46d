import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { packSticks, type PackingTerms, type StickWanted } from '#shared/core/cut/pack-sticks.ts';

const sticks = (...lengths: number[]): StickWanted[] => lengths.map((length, i) => ({ id: `${i}`, length }));
const terms = (changes: Partial<PackingTerms> = {}): PackingTerms => ({
  atHand: [],
  bought: 1000,
  kerf: 1,
  shortestOffcut: 50,
  ...changes,
});

/** Fewest bins by trying every way to part a set, without the packer's own shortcuts. */
function fewest(lengths: readonly number[], stock: number, kerf: number): number {
  let best = lengths.length;
  const put = (at: number, bins: number[]): void => {
    if (bins.length >= best) return;
    const length = lengths[at];
    if (length === undefined) {
      best = bins.length;
      return;
    }
    bins.forEach((left, i) => {
      if (left >= length + kerf - 1e-9) put(at + 1, bins.with(i, left - length - kerf));
    });
    put(at + 1, [...bins, stock + kerf - length - kerf]);
  };
  put(0, []);
  return best;
}

describe('packing sticks', () => {
  it('does with as few as the best of all ways, on every small case', () => {
    const lengths = fc.array(fc.integer({ min: 60, max: 990 }), { minLength: 1, maxLength: 7 });
    fc.assert(
      fc.property(lengths, fc.integer({ min: 0, max: 4 }), (list, kerf) => {
        const packing = packSticks(sticks(...list), terms({ kerf }));
        expect(packing.bought).toBe(fewest(list, 1000, kerf));
        expect(packing.bound).toBeLessThanOrEqual(packing.bought);
      }),
      { numRuns: 200 },
    );
  });

  it('finds the packing that first fit in falling order misses', () => {
    // Constructed: first fit puts 46 with 41 and needs three sticks of 100; 46 + 31 + 23 and 41 + 28 + 19 need two.
    const packing = packSticks(sticks(46, 41, 31, 28, 23, 19), terms({ bought: 100, kerf: 0 }));
    expect(packing).toMatchObject({ bought: 2, bound: 2 });
  });

  it('loses nothing, overlaps nothing, keeps its kerf and never leaves the stick', () => {
    const lengths = fc.array(fc.double({ min: 5, max: 1400, noNaN: true }), { maxLength: 40 });
    const hand = fc.array(
      fc.tuple(fc.double({ min: 100, max: 1200, noNaN: true }), fc.integer({ min: 1, max: 3 })),
      {
        maxLength: 4,
      },
    );
    fc.assert(
      fc.property(lengths, hand, fc.double({ min: 0, max: 3, noNaN: true }), (list, stock, kerf) => {
        const atHand = stock.map(([length, count], i) => ({ id: `h${i}`, length, count }));
        const packing = packSticks(sticks(...list), terms({ atHand, kerf }));
        const placed = packing.sticks.flatMap(({ cuts }) => cuts.map(({ id }) => id));
        const others = [...packing.tooLong.map(({ id }) => id), ...packing.unplaced];
        expect([...placed, ...others].toSorted()).toEqual(list.map((_, i) => `${i}`).toSorted());
        for (const { cuts, length, offcut } of packing.sticks) {
          let at = 0;
          for (const { id, from, to } of cuts) {
            expect(from).toBeGreaterThanOrEqual(at - 1e-6);
            expect(to - from).toBeCloseTo(list[Number(id)] ?? 0, 6);
            at = to + kerf;
          }
          expect(at - kerf).toBeLessThanOrEqual(length + 1e-6);
          expect(offcut).toBeLessThanOrEqual(Math.max(0, length - at) + 1e-6);
        }
        for (const { id, length, count } of atHand) {
          const used = packing.sticks.filter((one) => one.stock === id);
          expect(used.length).toBeLessThanOrEqual(count);
          expect(used.every((one) => one.length === length)).toBe(true);
        }
      }),
      { numRuns: 150 },
    );
  });

  it('takes what is at hand before it buys, and says what is too long or finds no place', () => {
    const atHand = [{ id: 'old', length: 700, count: 1 }];
    expect(packSticks(sticks(650, 600), terms({ atHand }))).toMatchObject({ bought: 1, bound: 1 });
    expect(packSticks(sticks(1250), terms({ atHand })).tooLong).toEqual([{ id: '0', by: 250 }]);
    expect(packSticks(sticks(650, 600), terms({ atHand, bought: null })).unplaced).toEqual(['1']);
  });

  it('needs no cut at the end of a stick that comes out even', () => {
    expect(packSticks(sticks(499.5, 499.5), terms()).bought).toBe(1);
    expect(packSticks(sticks(500, 499.5), terms()).bought).toBe(2);
  });
});
