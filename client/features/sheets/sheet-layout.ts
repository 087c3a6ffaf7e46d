import type { PrintedFigures, PrintedSheet } from '#shared/core/printed-sheet.ts';

/** One printed row of the balance table. */
export interface SheetRow {
  key: string;
  kind: 'group' | 'part' | 'total';
  name: string;
  material: string | null;
  figures: PrintedFigures;
}

/** How the balance table fits the page. */
export interface SheetLayout {
  /** rows of each column of the page */
  columns: SheetRow[][];
  /** mm */
  rowHeight: number;
  /** parts are left to the files, so many are there */
  partsLeftOut: number;
}

/** mm that the table may take on a page that is no taller than A4's and Letter's common ground. */
const ROOM = 140;
const TALLEST_ROW = 4.8;
/** Lower rows than this cannot be read, mm. */
const LOWEST_ROW = 2.7;
/** One column holds this many rows before two are easier to read. */
const ONE_COLUMN = 30;
/** How far from the middle the columns may part, as a share of all rows. */
const NEAR = 0.15;

/** Lays the table out so that it fits one page: in one column, in two, or, when there are too many, by groups only. */
export function layoutSheet(sheet: PrintedSheet, name: string): SheetLayout {
  const all = rowsOf(sheet, name);
  if (all.length <= ONE_COLUMN) return laid([all], 0);
  const half = splitAt(all);
  const columns = [all.slice(0, half), all.slice(half)];
  if (heightOf(columns) >= LOWEST_ROW) return laid(columns, 0);
  const groups = all.filter(({ kind }) => kind !== 'part');
  const middle = Math.ceil(groups.length / 2);
  const few = groups.length <= ONE_COLUMN;
  return laid(few ? [groups] : [groups.slice(0, middle), groups.slice(middle)], all.length - groups.length);
}

function rowsOf({ groups, total }: PrintedSheet, name: string): SheetRow[] {
  return [
    ...groups.flatMap((group): SheetRow[] => [
      { key: group.key, kind: 'group', name: group.name, material: null, figures: group },
      ...group.rows.map((row): SheetRow => ({
        key: row.id,
        kind: 'part',
        name: row.name,
        material: row.material,
        figures: row,
      })),
    ]),
    { key: 'total', kind: 'total', name, material: null, figures: total },
  ];
}

/** Before the group whose head is nearest the middle; in the middle itself where none is near. */
function splitAt(rows: readonly SheetRow[]): number {
  const middle = Math.ceil(rows.length / 2);
  const heads = rows.flatMap(({ kind }, i) => (kind === 'group' && i > 0 ? [i] : []));
  const nearest = heads.reduce((best, i) => (Math.abs(i - middle) < Math.abs(best - middle) ? i : best), 0);
  return Math.abs(nearest - middle) <= rows.length * NEAR ? nearest : middle;
}

function heightOf(columns: readonly SheetRow[][]): number {
  const most = Math.max(...columns.map(({ length }) => length));
  return Math.min(TALLEST_ROW, ROOM / (most + 1));
}

function laid(columns: SheetRow[][], partsLeftOut: number): SheetLayout {
  return { columns, rowHeight: heightOf(columns), partsLeftOut };
}
