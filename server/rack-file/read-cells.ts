import {
  stockPieceInput,
  type StockKind,
  type StockMaterial,
  type StockPieceInput,
} from '#shared/schemas/stock-piece.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { ParseProblem } from '#shared/units/scan.ts';
import { wordIssue } from '#server/http/issue-wording.ts';
import { quantityOf, type Column, type ColumnField, type MeasuredField } from './headers.ts';

/** Finds a row of the table of materials by its name. */
export type FindMaterial = (name: string) => StockMaterial | undefined;

export interface CellProblem {
  /** header of the column; null for the line as a whole */
  column: string | null;
  detail: string;
}

const UNREADABLE: Record<ParseProblem, string> = {
  missing: 'Is missing.',
  not_a_number: 'Is no number.',
  two_decimal_marks: 'Has two decimal marks; thousands may be parted by a space only.',
  divided_by_zero: 'Is a fraction over 0.',
  unknown_unit: 'Has a unit that is not known.',
  wrong_unit: 'Has a unit of something else.',
  several_units: 'Has a unit where it is multiplied or divided.',
};

const KINDS: Record<string, StockKind> = {
  sheet: 'sheet',
  plank: 'sheet',
  stick: 'stick',
  strip: 'stick',
  block: 'block',
  tube: 'tube',
  rod: 'tube',
  dowel: 'tube',
};

/** A sheet is at least so wide, mm, and so many times as wide as thick. */
const SHEET = { width: 25, ratio: 4 };

/** Reads the cells of one line as a piece, or says what is wrong with each. */
export class LineReader {
  private readonly problems: CellProblem[] = [];
  private readonly cells: ReadonlyMap<ColumnField, { column: Column; text: string }>;

  constructor(columns: readonly Column[], texts: readonly string[]) {
    this.cells = new Map(
      columns.flatMap((column, i) =>
        column.field === null
          ? []
          : [[column.field, { column, text: plainText((texts[i] ?? '').trim()) }] as const],
      ),
    );
  }

  read(findMaterial: FindMaterial): { piece: StockPieceInput } | { problems: CellProblem[] } {
    const draft = this.draft(findMaterial);
    const parsed = stockPieceInput.safeParse(draft, { error: wordIssue });
    const unseen = (issue: { path: PropertyKey[] }) =>
      !this.problems.some(({ column }) => column !== null && column === this.headerAt(issue.path));
    const issues = parsed.error?.issues.filter(unseen) ?? [];
    this.problems.push(
      ...issues.map(({ path, message }) => ({ column: this.headerAt(path), detail: message })),
    );
    if (this.problems.length > 0 || !parsed.success) return { problems: this.inOrder() };
    return { piece: parsed.data };
  }

  /** What is wrong, as one reads along the line. */
  private inOrder(): CellProblem[] {
    const headers = [...this.cells.values()].map(({ column }) => column.header);
    const place = ({ column }: CellProblem) => (column === null ? -1 : headers.indexOf(column));
    return this.problems.toSorted((a, b) => place(a) - place(b));
  }

  text(field: ColumnField): string {
    return this.cells.get(field)?.text ?? '';
  }

  private draft(findMaterial: FindMaterial): Record<keyof StockPieceInput, unknown> {
    const diameter = this.measure('diameter');
    const round = this.text('width') === '' && diameter !== undefined;
    const width = round ? diameter : this.measure('width');
    const thickness = round ? diameter : this.measure('thickness');
    const wall = this.measure('wall');
    const kind = this.kind({ width, thickness, wall, round });
    const solid = /^(rod|dowel)/i.test(this.text('kind')) || (round && wall === undefined);
    return {
      kind,
      material: this.material(findMaterial),
      length: this.measure('length'),
      width,
      thickness,
      wall: wall ?? (kind === 'tube' && solid && width !== undefined ? width / 2 : null),
      mass: this.measure('mass') ?? null,
      resolution: this.measure('resolution') ?? null,
      grade: this.text('grade'),
      grainCut: this.grainCut(),
      note: this.text('note'),
    };
  }

  /** In the plan's unit; undefined where the cell is empty or cannot be read. */
  private measure(field: MeasuredField): number | undefined {
    const cell = this.cells.get(field);
    if (!cell || cell.text === '') return undefined;
    if (cell.column.unit === null) {
      this.refuse(field, `The unit “${cell.column.unknownUnit}” of this column is not known.`);
      return undefined;
    }
    const read = parseQuantity(cell.text, quantityOf(field), cell.column.unit);
    if ('value' in read) return read.value;
    this.refuse(field, UNREADABLE[read.problem]);
    return undefined;
  }

  private kind(size: {
    width?: number | undefined;
    thickness?: number | undefined;
    wall?: number | undefined;
    round: boolean;
  }): unknown {
    const written = this.text('kind').toLowerCase();
    if (written !== '') {
      const known = KINDS[written] ?? KINDS[written.replace(/s$/, '')];
      if (known === undefined) this.refuse('kind', 'Must be one of sheet, stick, block, tube.');
      return known;
    }
    if (size.round || size.wall !== undefined) return 'tube';
    const { width = 0, thickness = 0 } = size;
    return width >= SHEET.width && width >= SHEET.ratio * thickness ? 'sheet' : 'stick';
  }

  private material(find: FindMaterial): unknown {
    const name = this.text('material');
    const known = find(name);
    const key = this.cells.has('materialKey') ? this.text('materialKey') || null : (known?.key ?? null);
    return { key, name, category: this.text('category').toLowerCase() || (known?.category ?? 'wood') };
  }

  private grainCut(): unknown {
    const written = this.text('grainCut');
    return written === ''
      ? null
      : (/^([abc])(?:[\s-]*(?:grain|cut))?$/i.exec(written)?.[1]?.toUpperCase() ?? written);
  }

  private refuse(field: ColumnField, detail: string): void {
    this.problems.push({ column: this.cells.get(field)?.column.header ?? null, detail });
  }

  /** The column that a field of the piece was read from. */
  private headerAt(path: PropertyKey[]): string | null {
    const place = path.join('.');
    const names: ColumnField[] = PLACES[place] ?? [place as ColumnField];
    const found = names.find((name) => this.cells.has(name));
    return found === undefined ? null : (this.cells.get(found)?.column.header ?? null);
  }
}

const PLACES: Record<string, ColumnField[]> = {
  'material.name': ['material'],
  'material.key': ['materialKey'],
  'material.category': ['category'],
  width: ['width', 'diameter'],
  thickness: ['thickness', 'diameter'],
};

/** Takes off the mark that keeps a spreadsheet from taking a text for a formula. */
export const plainText = (text: string) => (/^'+[=+\-@\t\r\n＝＋－＠]/u.test(text) ? text.slice(1) : text);
