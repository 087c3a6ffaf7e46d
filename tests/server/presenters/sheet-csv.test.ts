import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { csvTable } from '#server/presenters/csv.ts';
import { printedColumn } from '#server/presenters/printed-column.ts';
import { sheetCsv, sheetFileName } from '#server/presenters/sheet-csv.ts';
import { demoPlan, DEMO_NAMES, lineOf } from '#tests/support/plans.ts';
import { smallPlan } from '../support/rows.ts';

const rowsOf = (csv: string) =>
  csv
    .replace('\uFEFF', '')
    .trimEnd()
    .split('\r\n')
    .map((line) => line.split(','));
const sumOf = (cells: (string | undefined)[]) =>
  Decimal.sum(0, ...cells.map((cell) => cell ?? '')).toNumber();

describe('the balance sheet as CSV', () => {
  it.each(DEMO_NAMES)('adds up to its own totals to the last digit for %s', (name) => {
    const plan = demoPlan(name);
    const result = estimate(plan);
    // Commas in names would only make this test's reading of the file harder.
    const lines = result.lines.map((line) => ({ ...line, name: line.id, group: '', material: null }));
    const [head = [], ...rows] = rowsOf(sheetCsv({ plan, result: { ...result, lines } }));
    const [mass, moment] = [head.indexOf('Mass g'), head.indexOf('Moment g mm')];
    const [total = [], parts] = [rows.at(-1), rows.slice(0, -1)];
    expect(parts).toHaveLength(result.lines.length);
    expect(sumOf(parts.map((row) => row[mass]))).toBe(Number(total[mass]));
    expect(sumOf(parts.map((row) => row[moment]))).toBe(Number(total[moment]));
    expect(Math.abs(Number(total[mass]) - result.totals.mass)).toBeLessThanOrEqual(0.005 + 1e-9);
  });

  it('writes a line with the name of its material and figures rounded for print', () => {
    const plan = smallPlan();
    const result = estimate(plan);
    const nose = lineOf(result, 'item/nose');
    expect(nose.moment).toBe(-2_400); // 20 g × −120 mm
    const row = rowsOf(sheetCsv({ plan, result })).find(([id]) => id === 'item/nose');
    expect(row).toEqual([
      'item/nose',
      'Nose weight',
      'ballast',
      '',
      '1',
      '20.00',
      '0.00',
      '-120.0',
      '0.0',
      '0.0',
      '-2400.0',
    ]);
    expect(rowsOf(sheetCsv({ plan, result }))[1]?.slice(0, 4)).toEqual([
      'wing/ribs',
      'Ribs',
      expect.any(String),
      'Balsa',
    ]);
  });

  it('has a total of nothing for a plan of nothing', () => {
    const plan = smallPlan({ surfaces: [], items: [] });
    const rows = rowsOf(sheetCsv({ plan, result: estimate(plan) }));
    expect(rows.slice(1)).toEqual([['Total', '', '', '', '', '0.00', '0.00', '', '', '', '0.0']]);
  });
});

describe('cells', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '＝1+1'])(
    'never let the text %j start a formula',
    (text) => {
      expect(csvTable([[{ text }]]).replace(/^\uFEFF"?/, '')).toMatch(/^'/);
    },
  );

  it('leave a negative number a number', () => {
    expect(csvTable([[{ number: '-1.5' }, null, { text: 'a' }]])).toBe('\uFEFF-1.5,,a\r\n');
  });

  it('quote commas, quotes and line breaks as RFC 4180 asks', () => {
    expect(csvTable([[{ text: 'a,"b"\nc' }]])).toBe('\uFEFF"a,""b""\nc"\r\n');
  });
});

describe('a printed column', () => {
  it('adds up to the rounded true total, with every line within one last digit of its value', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -1e5, max: 1e5, noNaN: true }), { maxLength: 60 }), (values) => {
        const { lines, total } = printedColumn(values, 2);
        const exact = Decimal.sum(0, ...values);
        expect(Decimal.sum(0, ...lines).toFixed(2)).toBe(total);
        expect(exact.minus(total).abs().toNumber()).toBeLessThanOrEqual(0.005);
        for (const [i, line] of lines.entries()) {
          expect(new Decimal(values[i] ?? 0).minus(line).abs().toNumber()).toBeLessThan(0.01 + 1e-12);
        }
      }),
    );
  });

  it('shares out what rounding leaves over', () => {
    // Three times 0.333 is 0.999, printed 1.00; rounding each would print 0.99.
    expect(printedColumn([0.333, 0.333, 0.333], 2)).toEqual({
      lines: ['0.34', '0.33', '0.33'],
      total: '1.00',
    });
  });

  it('never prints a negative nothing', () => {
    expect(printedColumn([-0.001], 2)).toEqual({ lines: ['0.00'], total: '0.00' });
  });
});

describe('the name of a file', () => {
  it('keeps letters of any language and drops what a system would not take', () => {
    expect(sheetFileName({ gliderName: 'Möwe 2/3: "leicht"', number: 4 }, 'csv')).toBe(
      'Möwe 2 3 leicht, sheet 4.csv',
    );
    expect(sheetFileName({ gliderName: '../..', number: 1 }, 'csv')).toBe('.. .., sheet 1.csv');
    expect(sheetFileName({ gliderName: '???', number: 1 }, 'json')).toBe('Glider, sheet 1.json');
  });
});
