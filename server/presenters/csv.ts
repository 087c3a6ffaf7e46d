/** A number that is already written, or a text that somebody may have typed. */
export type Cell = { text: string } | { number: string } | null;

/**
 * A table as RFC 4180 asks for, with the mark that makes spreadsheets read UTF-8.
 * @returns lines ending in CR LF
 */
export function csvTable(rows: readonly (readonly Cell[])[]): string {
  return `\uFEFF${rows.map((row) => `${row.map(csvCell).join(',')}\r\n`).join('')}`;
}

function csvCell(cell: Cell): string {
  if (cell === null) return '';
  const value = 'number' in cell ? cell.number : harmless(cell.text);
  return /[",\r\n]/.test(value) ? `"${value.replaceAll('"', '""')}"` : value;
}

/**
 * A spreadsheet takes a text that begins so for a formula and would carry it out. A text that stands behind such a mark
 * already gets one more, so that a reader who takes one off has what was written.
 */
const harmless = (text: string) => (/^'*[=+\-@\t\r\n＝＋－＠]/u.test(text) ? `'${text}` : text);
