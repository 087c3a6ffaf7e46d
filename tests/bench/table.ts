import type { Ratio } from './measure.ts';

const HEADS = ['measured', 'ours', 'beside', 'ratio', 'at most', ''] as const;

/** Over its bound. */
export const isBroken = ({ ratio, most }: Ratio) => most !== undefined && !(ratio <= most);

/** True where a ratio of one run is over its bound; a time is no failure, for the machine may be busy. */
export const fails = (row: Ratio) => isBroken(row) && row.timed !== true;

function cellsOf(row: Ratio): string[] {
  const verdict = row.most === undefined ? '' : isBroken(row) ? (row.timed ? 'late' : 'BROKEN') : 'kept';
  return [
    row.what,
    row.ours,
    row.beside,
    row.ratio.toPrecision(3),
    row.most === undefined ? '' : `${row.most}${row.timed ? ', timed' : ''}`,
    verdict,
  ];
}

/** All rows in one table, columns in line. */
export function tableOf(rows: readonly Ratio[]): string {
  const lines = [[...HEADS], ...rows.map(cellsOf)];
  const widths = HEADS.map((_, i) => Math.max(...lines.map((line) => line[i]?.length ?? 0)));
  const text = lines.map((line) =>
    line
      .map((cell, i) => cell.padEnd(widths[i] ?? 0))
      .join('  ')
      .trimEnd(),
  );
  const [head = '', ...body] = text;
  return [head, '-'.repeat(Math.max(...text.map((line) => line.length))), ...body].join('\n');
}
