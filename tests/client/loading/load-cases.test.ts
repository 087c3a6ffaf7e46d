import { describe, expect, it } from 'vitest';
import {
  caseRows,
  keptCases,
  NO_CASES,
  shownCase,
  type KeptCases,
} from '#client/features/loading/spar/cases.ts';
import { loadFactorText, marginText, placeText, sparStanding } from '#client/features/loading/spar/words.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS } from '#shared/format/units.ts';

const kept = (speeds: Partial<KeptCases['speeds']>, shown: KeptCases['shown'] = 'stated'): KeptCases => ({
  speeds: { ...NO_CASES.speeds, ...speeds },
  shown,
});
const factors = (cases: KeptCases, stall: number | null) =>
  caseRows(cases, 6, stall).map(({ key, loadFactor }) => [key, loadFactor]);

describe('load cases', () => {
  it('take the stated load factor as it is, and the others from the square of speed over stall', () => {
    // 12 over 4 is 3, squared 9; 6 over 4 is 1.5, squared 2.25.
    expect(factors(kept({ tow: 12, gust: 6 }), 4)).toEqual([
      ['stated', 6],
      ['tow', 9],
      ['throw', null],
      ['gust', 2.25],
    ]);
  });

  it('have no load factor without a stall speed, or at a stand', () => {
    expect(factors(kept({ tow: 12 }), null)[1]).toEqual(['tow', null]);
    expect(factors(kept({ tow: 0 }), 4)[1]).toEqual(['tow', null]);
  });

  it('fall back on the stated one while the picked one has no speed', () => {
    expect(shownCase(caseRows(kept({ tow: 8 }, 'tow'), 6, 4), 'tow')).toMatchObject({ loadFactor: 4 });
    expect(shownCase(caseRows(kept({}, 'tow'), 6, 4), 'tow')).toMatchObject({ key: 'stated', loadFactor: 6 });
  });

  it('are read back from the browser only where they fit', () => {
    expect(keptCases.safeParse(kept({ throw: 11 }, 'throw')).success).toBe(true);
    expect(keptCases.safeParse({ speeds: { tow: 900, throw: null, gust: null }, shown: 'tow' }).success).toBe(
      false,
    );
  });
});

describe('words about the spar', () => {
  it('tell a margin in one decimal, one beyond meaning as such, and never one under 1 as 1', () => {
    expect([4.217, 0.9999, 99.94, 3414].map(marginText)).toEqual(['4.2', '0.99', '99.9', 'over 100']);
    expect(marginText(null)).toBe('–');
  });

  it('tell a load factor without a needless decimal', () => {
    expect([6, 7.25, 2.004].map(loadFactorText)).toEqual(['6\u202fg', '7.3\u202fg', '2\u202fg']);
  });

  it('call a margin under 1 outside, however little, and one within a third of it close', () => {
    expect([0.9999, 1, 1.49, 1.5].map(sparStanding)).toEqual(['outside', 'close', 'close', 'inside']);
  });

  it('name the root, and other places in the reader’s unit', () => {
    expect(placeText(0, USUAL_UNITS)).toBe('at the root');
    expect(placeText(254, USUAL_UNITS)).toBe('254.0\u202fmm from the root');
    expect(placeText(254, unitsOf(INCH_CHOICES))).toBe('10.000\u202fin from the root');
  });
});
