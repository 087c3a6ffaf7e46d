import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tradeOffs } from '#shared/core/trade-offs.ts';

interface Row {
  mass: number | null;
  margin: number | null;
}
const aims = { small: (row: Row) => row.mass, large: (row: Row) => row.margin };
const few = fc.option(fc.integer({ min: 0, max: 6 }), { freq: 8 });
const rows = fc.array(fc.record({ mass: few, margin: few }), { maxLength: 12 });

const beats = (a: Row, b: Row) =>
  a.mass! <= b.mass! && a.margin! >= b.margin! && (a.mass! < b.mass! || a.margin! > b.margin!);

describe('the best trades', () => {
  it('are the rows that no other beats, by looking at every pair', () => {
    fc.assert(
      fc.property(rows, (list) => {
        const told = list.filter(({ mass, margin }) => mass !== null && margin !== null);
        const wanted = list.map((row) => told.includes(row) && !told.some((other) => beats(other, row)));
        expect(tradeOffs(list, aims)).toEqual(wanted);
      }),
      { numRuns: 2000, seed: 3 },
    );
  });

  it('keep both of two rows that are alike, and a single row', () => {
    const one = { mass: 7, margin: 2 };
    expect(tradeOffs([one, { ...one }], aims)).toEqual([true, true]);
    expect(tradeOffs([one], aims)).toEqual([true]);
    expect(tradeOffs([], aims)).toEqual([]);
  });

  it('take infinite margins, and leave out what is not a number', () => {
    const endless = { mass: 5, margin: Infinity };
    expect(tradeOffs([endless, { mass: 5, margin: 3 }, { mass: Number.NaN, margin: 9 }], aims)).toEqual([
      true,
      false,
      false,
    ]);
  });
});
