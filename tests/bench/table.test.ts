import { describe, expect, it } from 'vitest';
import type { Ratio } from './measure.ts';
import { fails, isBroken, tableOf } from './table.ts';

const row = (more: Partial<Ratio>): Ratio => ({
  what: 'it',
  ours: '2 ms',
  beside: '1 ms',
  ratio: 2,
  ...more,
});

describe('a bound of the bench', () => {
  it('fails where a ratio is over it, or is no number, and not where a time is', () => {
    expect(fails(row({ most: 1.9 }))).toBe(true);
    expect(fails(row({ most: 2 }))).toBe(false);
    expect(fails(row({ most: 3, ratio: Number.NaN }))).toBe(true);
    expect(fails(row({ most: 1, timed: true }))).toBe(false);
    expect(isBroken(row({ most: 1, timed: true }))).toBe(true);
    expect(isBroken(row({}))).toBe(false);
  });

  it('stands in the table with what became of it', () => {
    const rows = [
      row({ what: 'kept', most: 3 }),
      row({ what: 'broken', most: 1 }),
      row({ what: 'a late one', most: 1, timed: true }),
      row({ what: 'free' }),
    ];
    const [head, , ...lines] = tableOf(rows).split('\n');
    expect(head).toMatch(/^measured +ours +beside +ratio +at most$/);
    expect(lines.map((line) => line.split(/ {2,}/).at(-1))).toEqual(['kept', 'BROKEN', 'late', '2.00']);
  });
});
