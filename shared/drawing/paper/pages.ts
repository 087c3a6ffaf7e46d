import type { Point } from '../shape.ts';
import type { TrueDrawing } from './true-size.ts';

/** A paper that printers hold, mm, upright. */
export interface Paper {
  name: string;
  width: number;
  height: number;
}
/** ISO 216, and ANSI/ASME Y14.1 size A: 8.5 × 11 in. */
export const PAPERS = {
  a4: { name: 'A4', width: 210, height: 297 },
  letter: { name: 'Letter', width: 215.9, height: 279.4 },
} as const satisfies Record<string, Paper>;
export type PaperName = keyof typeof PAPERS;

/** Room that printers leave white at the sides and top, and that is kept for the check line at the foot, mm. */
export const MARGIN = 8;
export const FOOT = 18;
/** Neighbours share a strip so wide, to be laid one on the other, mm. */
export const OVERLAP = 10;

/** One page: which, of how many, and what corner of the drawing its own corner shows. */
export interface Page {
  number: number;
  row: number;
  column: number;
  at: Point;
}

export interface Pages {
  paper: Sides;
  /** size of what a page shows of the drawing, mm */
  window: Sides;
  drawing: TrueDrawing;
  pages: Page[];
  rows: number;
  columns: number;
  /** where neighbours meet, in the drawing's own mm; each lies on all pages that share it */
  registers: Point[];
}

/** A paper as it is held: its sides, mm. */
export type Sides = Pick<Paper, 'width' | 'height'>;

/** Both ways to lay a paper. */
export const upright = ({ width, height }: Paper): Sides => ({ width, height });
export const across = ({ width, height }: Paper): Sides => ({ width: height, height: width });
/** What a page shows of a drawing. */
export const windowOf = ({ width, height }: Sides): Sides => ({
  width: width - 2 * MARGIN,
  height: height - MARGIN - FOOT,
});

/** A drawing cut into pages, upright or across, whichever takes fewer; pages with nothing on them are left out. */
export function tiled(drawing: TrueDrawing, paper: Paper): Pages {
  const ways = [upright(paper), across(paper)].map((sheet) => laidOut(drawing, sheet));
  const [first, second] = ways;
  if (!first || !second) throw new RangeError('there are two ways to lay a paper');
  return second.pages.length < first.pages.length ? second : first;
}

function laidOut(drawing: TrueDrawing, sheet: Sides): Pages {
  const window = windowOf(sheet);
  const [stepX, stepY] = [window.width - OVERLAP, window.height - OVERLAP];
  const count = (size: number, whole: number, step: number) =>
    size <= whole ? 1 : 1 + Math.ceil((size - whole) / step - 1e-9);
  const columns = count(drawing.width, window.width, stepX);
  const rows = count(drawing.height, window.height, stepY);
  const grid = Array.from({ length: rows * columns }, (_, i) => {
    const [row, column] = [Math.floor(i / columns), i % columns];
    return { row, column, at: [column * stepX, row * stepY] as const };
  });
  const pages = grid
    .filter(({ at }) => holdsAnything(drawing, at, window))
    .map((page, i): Page => ({ ...page, number: i + 1 }));
  const registers = Array.from({ length: (rows + 1) * (columns + 1) }, (_, i): Point => {
    const [row, column] = [Math.floor(i / (columns + 1)), i % (columns + 1)];
    return [column * stepX + OVERLAP / 2, row * stepY + OVERLAP / 2];
  });
  return { paper: sheet, window, drawing, pages, rows, columns, registers };
}

/** Whether any line of the drawing touches a window. */
function holdsAnything(
  { strokes, letters }: TrueDrawing,
  [left, top]: Point,
  { width, height }: Sides,
): boolean {
  const touches = (a: Point, b: Point) =>
    Math.max(a[0], b[0]) >= left &&
    Math.min(a[0], b[0]) <= left + width &&
    Math.max(a[1], b[1]) >= top &&
    Math.min(a[1], b[1]) <= top + height;
  return (
    letters.some(({ at }) => touches(at, at)) ||
    strokes.some(({ points, closed }) =>
      points.some((p, i) => touches(p, points[i - 1] ?? (closed ? (points.at(-1) ?? p) : p))),
    )
  );
}
