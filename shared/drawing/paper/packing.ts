import type { Point } from '../shape.ts';
import { across, upright, windowOf, type Pages, type Paper, type Sides } from './pages.ts';
import { moved, type TrueDrawing } from './true-size.ts';

/** Gap between neighbours on a page, mm. */
const GAP = 3;

/**
 * Small drawings side by side on pages, none cut in two; null where one of them is larger than a page. Together they
 * are one drawing of pages under each other.
 */
export function packed(title: string, drawings: readonly TrueDrawing[], paper: Paper): Pages | null {
  const ways = [upright(paper), across(paper)].flatMap((sheet) => packedOn(title, drawings, sheet) ?? []);
  return ways.reduce<Pages | null>(
    (best, way) => (best && best.pages.length <= way.pages.length ? best : way),
    null,
  );
}

function packedOn(title: string, drawings: readonly TrueDrawing[], sheet: Sides): Pages | null {
  const window = windowOf(sheet);
  let [page, x, y, rowHeight] = [0, 0, 0, 0];
  const placed = drawings.map((drawing) => {
    if (x > 0 && x + drawing.width > window.width) [x, y, rowHeight] = [0, y + rowHeight + GAP, 0];
    if (y > 0 && y + drawing.height > window.height) [page, x, y, rowHeight] = [page + 1, 0, 0, 0];
    const at: Point = [x, page * window.height + y];
    x += drawing.width + GAP;
    rowHeight = Math.max(rowHeight, drawing.height);
    return moved(drawing, at);
  });
  if (drawings.some(({ width, height }) => width > window.width || height > window.height)) return null;
  const count = drawings.length === 0 ? 0 : page + 1;
  return {
    paper: sheet,
    window,
    drawing: {
      title,
      width: window.width,
      height: count * window.height,
      strokes: placed.flatMap(({ strokes }) => strokes),
      letters: placed.flatMap(({ letters }) => letters),
    },
    pages: Array.from({ length: count }, (_, i) => ({
      number: i + 1,
      row: i,
      column: 0,
      at: [0, i * window.height] as const,
    })),
    rows: count,
    columns: 1,
    registers: [],
  };
}

/** Small drawings under each other as one, for a file. */
export function stacked(title: string, drawings: readonly TrueDrawing[]): TrueDrawing {
  let y = 0;
  const placed = drawings.map((drawing) => {
    const at: Point = [0, y];
    y += drawing.height + GAP;
    return moved(drawing, at);
  });
  return {
    title,
    width: Math.max(0, ...drawings.map(({ width }) => width)),
    height: Math.max(0, y - GAP),
    strokes: placed.flatMap(({ strokes }) => strokes),
    letters: placed.flatMap(({ letters }) => letters),
  };
}
