import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { apportion } from '#shared/core/apportion.ts';
import { printedSheet, type PrintedFigures } from '#shared/core/printed-sheet.ts';
import type { Line } from '#shared/core/result.ts';

function line(id: string, group: string, surface: string | null, mass: number, x: number, u = 0): Line {
  const blank = { material: null, pieces: 1, length: null, area: null, volume: null };
  return { ...blank, id, name: id, group, surface, mass, u, at: [x, 0, 0], moment: mass * x };
}

const anyLine = fc.record({
  group: fc.constantFrom('wing', 'Gear', 'fuselage'),
  surface: fc.constantFrom(null, null, 'wing', 'fin'),
  mass: fc.oneof(
    fc.constant(0),
    fc.double({ min: 0, max: 900, noNaN: true }),
    fc.integer({ max: 90, min: 1 }),
  ),
  x: fc.double({ min: -400, max: 900, noNaN: true }),
  u: fc.double({ min: 0, max: 3, noNaN: true }),
});
const anyLines = fc
  .array(anyLine, { minLength: 1, maxLength: 40 })
  .map((all) => all.map((l, i) => line(`part-${i}`, l.group, l.surface, l.mass, l.x, l.u)));

const sum = (figures: readonly PrintedFigures[], column: 'mass' | 'moment' | 'share') =>
  Decimal.sum(0, ...figures.map((f) => f[column]));

describe('printedSheet', () => {
  it('gives the lost tenth to the part with the largest remainder', () => {
    // By hand: 10.04 + 10.04 + 10.03 = 30.11 prints 30.1; the tenths of the parts alone come to 30.0.
    const lines = [10.04, 10.03, 10.04].map((mass, i) => line(`rib-${i}`, 'wing', 'wing', mass, 10));
    const { groups, total } = printedSheet({ lines });
    expect(total.mass).toBe('30.1');
    expect(groups[0]?.rows.map((r) => r.mass)).toEqual(['10.1', '10.0', '10.0']);
  });

  it('prints masses, moments and shares that add up to the printed totals at both levels', () => {
    fc.assert(
      fc.property(anyLines, (lines) => {
        const { groups, total } = printedSheet({ lines });
        for (const column of ['mass', 'moment', 'share'] as const) {
          expect(sum(groups, column).toString()).toBe(new Decimal(total[column]).toString());
          for (const group of groups) {
            expect(sum(group.rows, column).toString()).toBe(new Decimal(group[column]).toString());
          }
        }
      }),
    );
  });

  it('moves no figure by a whole unit of its last digit', () => {
    fc.assert(
      fc.property(anyLines, (lines) => {
        const { groups, digits } = printedSheet({ lines });
        const exact = new Map(lines.map((l) => [l.id, l]));
        for (const row of groups.flatMap((g) => g.rows)) {
          for (const column of ['mass', 'moment'] as const) {
            const apart = new Decimal(row[column]).minus(exact.get(row.id)?.[column] ?? Number.NaN).abs();
            expect(apart.lessThan(new Decimal(10).pow(-digits[column]))).toBe(true);
          }
        }
      }),
    );
  });

  it('leaves what is exact to the last digit as it is', () => {
    fc.assert(
      fc.property(anyLines, fc.integer({ min: 1, max: 900 }), (lines, tenths) => {
        const { groups, digits } = printedSheet({
          lines: [...lines, line('lead', 'ballast', null, tenths / 10, -150)],
        });
        const lead = groups.find((g) => g.key === 'ballast')?.rows[0];
        expect(lead?.mass).toBe(new Decimal(tenths).div(10).toFixed(digits.mass));
      }),
    );
  });

  it('adds in decimals, so that 20.1 + 20.2 + 0.05 is 40.35 and not a little less', () => {
    const lines = [20.1, 20.2, 0.05].map((mass, i) => line(`item-${i}`, 'gear', null, mass, 0));
    expect(20.1 + 20.2 + 0.05).toBeLessThan(40.35);
    expect(printedSheet({ lines }).total.mass).toBe('40.4');
  });

  it('prints hundredths for a model under 20 g', () => {
    const { total } = printedSheet({ lines: [line('stick', 'fuselage', null, 1.234, 100, 0.0801)] });
    expect(total).toEqual({ mass: '1.23', u: '0.08', arm: '100.0', moment: '123.4', share: '100.0' });
  });

  it('prints a small uncertainty as one unit and none as none', () => {
    const { groups } = printedSheet({
      lines: [line('tip', 'wing', 'wing', 30, 5, 0.02), line('wire', 'gear', null, 4, 5, 0)],
    });
    expect(groups.map((g) => g.u)).toEqual(['0.1', '0.0']);
  });

  it('adds uncertainties in quadrature: 0.3 and 0.4 make 0.5', () => {
    const { groups, total } = printedSheet({
      lines: [line('a', 'wing', 'wing', 30, 5, 0.3), line('b', 'wing', 'wing', 30, 5, 0.4)],
    });
    expect([groups[0]?.u, total.u]).toEqual(['0.5', '0.5']);
  });

  it('joins a solid of the group Wing to the surface wing, and names groups with a capital', () => {
    const { groups } = printedSheet({
      lines: [
        line('rib', 'ribs', 'wing', 2, 0),
        line('rx', 'gear', null, 3, 0),
        line('joiner', 'Wing', null, 5, 0),
      ],
    });
    expect(groups.map((g) => [g.name, g.mass])).toEqual([
      ['Wing', '7.00'],
      ['Gear', '3.00'],
    ]);
  });

  it('has no arm where nothing has a mass, and a share of nothing is none', () => {
    const { groups, total } = printedSheet({ lines: [line('ghost', 'gear', null, 0, 30)] });
    expect([groups[0]?.arm, groups[0]?.share, total.arm, total.share, total.moment]).toEqual([
      null,
      '0.0',
      null,
      '0.0',
      '0.0',
    ]);
  });
});

describe('apportion', () => {
  it('takes negative figures down first as well: -0.6 and 0.6 stay one apart from none', () => {
    expect(apportion(['-0.6', '0.6'], 0, 0).map(String)).toEqual(['-1', '1']);
  });
});
