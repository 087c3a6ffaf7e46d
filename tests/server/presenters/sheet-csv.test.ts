import { Decimal } from 'decimal.js';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { csvTable } from '#server/presenters/csv.ts';
import { sheetCsv, sheetFileName } from '#server/presenters/sheet-csv.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan, DEMO_NAMES } from '#tests/support/plans.ts';
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
    const lines = result.lines.map((line) => ({ ...line, name: line.id, group: 'all', material: null }));
    const [head = [], ...rows] = rowsOf(sheetCsv({ plan, result: { ...result, lines } }, USUAL_UNITS));
    const [total = [], parts] = [rows.at(-1), rows.slice(0, -1)];
    expect(parts).toHaveLength(result.lines.length);
    for (const column of ['Mass g', 'Moment g mm', 'Share %'].map((title) => head.indexOf(title))) {
      expect(sumOf(parts.map((row) => row[column]))).toBe(Number(total[column]));
    }
    expect(Number(total[head.indexOf('Mass g')])).toBeCloseTo(result.totals.mass, 1);
  });

  it('writes a line with the name of its material and figures as printed', () => {
    const plan = smallPlan();
    const result = estimate(plan);
    const rows = rowsOf(sheetCsv({ plan, result }, USUAL_UNITS));
    const nose = rows.find(([id]) => id === 'item/nose');
    // 20 g at −120 mm: −2400 g·mm.
    expect(nose?.slice(0, 9)).toEqual([
      'item/nose',
      'Nose weight',
      'Ballast',
      '',
      '1',
      '20.0',
      '0.0',
      '-120.0',
      '-2400',
    ]);
    const ribs = rows.find(([id]) => id === 'wing/ribs');
    expect(ribs?.slice(0, 5)).toEqual(['wing/ribs', 'Ribs', expect.any(String), 'Balsa', '24']);
  });

  it('has a total of nothing for a plan of nothing', () => {
    const plan = smallPlan({ surfaces: [], items: [] });
    const rows = rowsOf(sheetCsv({ plan, result: estimate(plan) }, USUAL_UNITS));
    expect(rows.slice(1)).toEqual([['Total', '', '', '', '', '0.00', '0.00', '', '0.0', '0.0']]);
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

describe('the name of a file', () => {
  it('keeps letters of any language and drops what a system would not take', () => {
    expect(sheetFileName({ gliderName: 'Möwe 2/3: "leicht"', number: 4 }, 'csv')).toBe(
      'Möwe 2 3 leicht, sheet 4.csv',
    );
    expect(sheetFileName({ gliderName: '../..', number: 1 }, 'csv')).toBe('.. .., sheet 1.csv');
    expect(sheetFileName({ gliderName: '???', number: 1 }, 'json')).toBe('Glider, sheet 1.json');
  });
});
