import { printedSheet, type PrintedFigures } from '#shared/core/printed-sheet.ts';
import { printingOf } from '#shared/format/printing.ts';
import type { Units } from '#shared/format/units.ts';
import type { SheetDto } from '#shared/schemas/sheet.ts';
import { csvTable, type Cell } from './csv.ts';

function headIn(units: Units): string[] {
  // Spreadsheets of every age read a plain space.
  const moment = units.label('moment').replace('·', ' ');
  return [
    'Line',
    'Name',
    'Group',
    'Material',
    'Pieces',
    `Mass ${units.label('mass')}`,
    `Uncertainty ${units.label('mass')}`,
    `Arm ${units.label('length')}`,
    `Moment ${moment}`,
    'Share %',
  ];
}

const text = (value: string): Cell => ({ text: value });
const number = (value: string): Cell => ({ number: value });

/**
 * A balance sheet as a table, with the figures that the reader sees on screen and paper: one row a part, and a last row
 * with what the columns add up to.
 */
export function sheetCsv({ plan, result }: Pick<SheetDto, 'plan' | 'result'>, units: Units): string {
  const { groups, total } = printedSheet(result, printingOf(units));
  const pieces = new Map(result.lines.map((line) => [line.id, line.pieces]));
  const materialName = (key: string) => plan.materials[key]?.name ?? key;
  const rows = groups.flatMap((group) =>
    group.rows.map((row) => [
      text(row.id),
      text(row.name),
      text(group.name),
      row.material === null ? null : text(materialName(row.material)),
      number(String(pieces.get(row.id) ?? '')),
      ...figures(row),
    ]),
  );
  return csvTable([
    headIn(units).map(text),
    ...rows,
    [text('Total'), null, null, null, null, ...figures(total)],
  ]);
}

function figures({ mass, u, arm, moment, share }: PrintedFigures): Cell[] {
  return [number(mass), number(u), arm === null ? null : number(arm), number(moment), number(share)];
}

/** @example sheetFileName({ gliderName: 'Dunlin', number: 2 }, 'csv') // → 'Dunlin, sheet 2.csv' */
export function sheetFileName(sheet: Pick<SheetDto, 'gliderName' | 'number'>, extension: string): string {
  // Signs that one or the other system does not allow in a name.
  const name = sheet.gliderName.replace(/[\\/:*?"<>|\p{C}\s]+/gu, ' ').trim();
  return `${name || 'Glider'}, sheet ${sheet.number}.${extension}`;
}
