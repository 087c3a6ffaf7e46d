import type { SheetDto } from '#shared/schemas/sheet.ts';
import { csvTable, type Cell } from './csv.ts';
import { printedColumn } from './printed-column.ts';

const HEAD = [
  'Line',
  'Name',
  'Group',
  'Material',
  'Pieces',
  'Mass g',
  'Uncertainty g',
  'x mm',
  'y mm',
  'z mm',
  'Moment g mm',
];

const MASS_DIGITS = 2;
const ARM_DIGITS = 1;
const MOMENT_DIGITS = 1;

const text = (value: string): Cell => ({ text: value });
const number = (value: string): Cell => ({ number: value });
const rounded = (value: number, digits: number) => number(printedColumn([value], digits).total);

/** A balance sheet as a table: one row a line, and a last row whose masses and moments are the columns' sums. */
export function sheetCsv({ plan, result }: Pick<SheetDto, 'plan' | 'result'>): string {
  const masses = printedColumn(
    result.lines.map((line) => line.mass),
    MASS_DIGITS,
  );
  const moments = printedColumn(
    result.lines.map((line) => line.moment),
    MOMENT_DIGITS,
  );
  const arms = (at: readonly number[] | null): Cell[] =>
    at ? at.map((value) => rounded(value, ARM_DIGITS)) : [null, null, null];
  const rows = result.lines.map((line, i) => [
    text(line.id),
    text(line.name),
    text(line.group),
    line.material === null ? null : text(plan.materials[line.material]?.name ?? line.material),
    number(String(line.pieces)),
    number(masses.lines[i] ?? ''),
    rounded(line.u, MASS_DIGITS),
    ...arms(line.at),
    number(moments.lines[i] ?? ''),
  ]);
  const total = [
    text('Total'),
    null,
    null,
    null,
    null,
    number(masses.total),
    rounded(result.totals.u, MASS_DIGITS),
    ...arms(result.totals.at),
    number(moments.total),
  ];
  return csvTable([HEAD.map(text), ...rows, total]);
}

/** @example sheetFileName({ gliderName: 'Dunlin', number: 2 }, 'csv') // → 'Dunlin, sheet 2.csv' */
export function sheetFileName(sheet: Pick<SheetDto, 'gliderName' | 'number'>, extension: string): string {
  // Signs that one or the other system does not allow in a name.
  const name = sheet.gliderName.replace(/[\\/:*?"<>|\p{C}\s]+/gu, ' ').trim();
  return `${name || 'Glider'}, sheet ${sheet.number}.${extension}`;
}
