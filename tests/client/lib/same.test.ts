import { describe, expect, it } from 'vitest';
import { same } from '#client/lib/same.ts';

describe('same', () => {
  it('does not mind the order of keys, which the database does not keep', () => {
    expect(same({ a: 1, b: [{ c: 2, d: 3 }] }, { b: [{ d: 3, c: 2 }], a: 1 })).toBe(true);
  });

  it('takes an undefined key for an absent one', () => {
    expect(same({ a: 1, group: undefined }, { a: 1 })).toBe(true);
  });

  it('minds the order of a list', () => {
    expect(same([1, 2], [2, 1])).toBe(false);
  });

  it('tells an empty list from an empty object and 0 from nothing', () => {
    expect([same([], {}), same({ a: 0 }, {}), same({ a: null }, {})]).toEqual([false, false, false]);
  });
});
