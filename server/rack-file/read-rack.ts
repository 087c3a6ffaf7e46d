import Papa from 'papaparse';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { ImportPreviewDto } from '#shared/schemas/rack.ts';
import { isStorable } from '#server/http/bounds.ts';
import { decodeTable } from './decode-table.ts';
import { doubtOf } from './doubts.ts';
import { LONGEST_HEADER, missingColumns, readHeaders, type Column } from './headers.ts';
import { LineReader, type CellProblem, type FindMaterial } from './read-cells.ts';

type Delimiter = ImportPreviewDto['delimiter'];
type GoodLine = ImportPreviewDto['rows'][number];
type BadLine = ImportPreviewDto['bad'][number];

const DELIMITERS: readonly Delimiter[] = [',', ';', '\t'];
const MOST_COLUMNS = 100;
const LONGEST_TEXT = 200;

interface Line {
  /** counted from 1 as an editor counts */
  line: number;
  cells: string[];
  /** as it stands in the file */
  text: string;
  /** a quotation mark that does not match: in this line, or from it on to the end of the file */
  stray: 'here' | 'onwards' | null;
}

/**
 * Reads a table of stock. Nothing is stored, and nothing is guessed that is not shown: every line is a piece, or bad
 * with its reasons.
 * @returns the preview, or why the file as a whole is no table of stock
 */
export function readRack(bytes: Buffer, findMaterial: FindMaterial): ImportPreviewDto | { problem: string } {
  const { encoding, text } = decodeTable(bytes);
  const { delimiter, lines } = readLines(text);
  const [head, ...rest] = lines;
  if (!head) return { problem: 'Has nothing in it.' };
  if (head.stray !== null) return { problem: 'Has quotation marks that do not match in its first line.' };
  if (head.cells.length > MOST_COLUMNS) return { problem: `Has more than ${MOST_COLUMNS} columns.` };
  const columns = readHeaders(head.cells);
  const missing = missingColumns(columns);
  if (missing.length > 0) {
    return { problem: `Has no column ${missing.join(', ')}: the first line must name the columns.` };
  }
  if (rest.length > LIMITS.rackImport.max) {
    return { problem: `Has more than ${LIMITS.rackImport.max} lines; take it in as several files.` };
  }
  const rows: GoodLine[] = [];
  const bad: BadLine[] = [];
  for (const line of rest) {
    const read = readLine(line, columns, findMaterial);
    if ('piece' in read) rows.push({ line: line.line, ...read });
    else bad.push({ line: line.line, text: shortened(line.text, LONGEST_TEXT), problems: read.problems });
  }
  return {
    encoding,
    delimiter,
    columns: columns.map(({ header, field, unit, unknownUnit }) => ({
      header: shortened(header, LONGEST_HEADER),
      field,
      unit: unit ?? unknownUnit,
    })),
    rows,
    bad,
  };
}

const STRAY = {
  here: 'Has quotation marks that do not match.',
  onwards: 'Has quotation marks that do not match, as many lines before; what follows is not read.',
};

function readLine(
  { cells, text, stray }: Line,
  columns: readonly Column[],
  findMaterial: FindMaterial,
): Pick<GoodLine, 'piece' | 'doubt'> | { problems: CellProblem[] } {
  const whole = (detail: string) => ({ problems: [{ column: null, detail }] });
  if (stray !== null) return whole(STRAY[stray]);
  if (!isStorable(text)) return whole('Has a character that is not text.');
  if (cells.slice(columns.length).some((cell) => cell.trim() !== '')) {
    return whole('Has more cells than the first line has columns. Is a decimal comma taken for a border?');
  }
  const reader = new LineReader(columns, cells);
  const read = reader.read(findMaterial);
  if ('problems' in read) return read;
  const state = reader.text('state').toLowerCase();
  const gone = state === 'used' || state === 'split';
  return {
    piece: read.piece,
    doubt: gone ? `Was ${state} when the file was written; it would come in as free.` : doubtOf(read.piece),
  };
}

/** Lines that are not blank, cut at the delimiter by which its first line names the most columns. */
function readLines(text: string): { delimiter: Delimiter; lines: Line[] } {
  // Some spreadsheets say so in a line before the first.
  const told = /^sep=([,;\t])\n/i.exec(text);
  const start = told?.[0].length ?? 0;
  const chosen =
    DELIMITERS.find((one) => one === told?.[1]) ??
    DELIMITERS.map((one) => ({ one, known: columnsKnown(text, one) })).reduce((best, next) =>
      next.known > best.known ? next : best,
    ).one;
  return { delimiter: chosen, lines: parse(text, start, chosen) };
}

function columnsKnown(text: string, delimiter: Delimiter): number {
  const { data } = Papa.parse<string[]>(text.trimStart(), { delimiter, newline: '\n', preview: 1 });
  return readHeaders((data[0] ?? []).slice(0, MOST_COLUMNS)).filter(({ field }) => field !== null).length;
}

/** So often a line with a stray quotation mark is stepped over; behind the last one the file is not read on. */
const MOST_STRAY = 50;

function parse(text: string, start: number, delimiter: Delimiter): Line[] {
  const lines: Line[] = [];
  let line = start > 0 ? 2 : 1;
  let from = start;
  for (let stray = 0; from < text.length && stray <= MOST_STRAY; stray += 1) {
    const body = text.slice(from);
    let done = 0;
    Papa.parse<string[]>(body, {
      delimiter,
      newline: '\n',
      step: ({ data, errors, meta }, parser) => {
        const broken = errors.length > 0;
        // A mark that is not closed would take in the lines behind it.
        const end = broken && stray < MOST_STRAY ? body.indexOf('\n', done) + 1 || body.length : meta.cursor;
        const raw = body.slice(done, end);
        if (data.some((cell) => cell.trim() !== '')) {
          const mark = stray < MOST_STRAY ? 'here' : 'onwards';
          lines.push({ line, cells: data, text: raw.trimEnd(), stray: broken ? mark : null });
        }
        line += raw.split('\n').length - 1;
        done = end;
        // The first line, as many as are taken in, and one that tells of more.
        if (broken || lines.length > LIMITS.rackImport.max + 1) parser.abort();
      },
    });
    if (lines.length > LIMITS.rackImport.max + 1) break;
    from += done;
  }
  return lines;
}

/** Cut without leaving half a character. */
const shortened = (text: string, most: number) =>
  text.length <= most ? text : `${text.slice(0, most).replace(/\p{Surrogate}$/u, '')}…`;
