import { PENS, strokePath } from '#shared/drawing/paper/svg-file.ts';
import { FOOT, MARGIN, type Page, type Pages } from '#shared/drawing/paper/pages.ts';
import type { Pen } from '#shared/drawing/paper/true-size.ts';

interface PageSheetProps {
  pages: Pages;
  page: Page;
}

/** Length of the line that tells whether the printer kept the scale, mm. */
const CHECK = 100;
const REGISTER = 4;
const PENS_USED = Object.keys(PENS) as Pen[];

/** One page at its true size, in mm: a window on the drawing, register marks, the check line and what page it is. */
export function PageSheet({ pages, page }: PageSheetProps) {
  const { paper, window, drawing, registers } = pages;
  const [left, top] = page.at;
  const foot = paper.height - FOOT;
  const where = pages.columns > 1 || (pages.rows > 1 && registers.length > 0);
  return (
    <svg
      width={`${paper.width}mm`}
      height={`${paper.height}mm`}
      viewBox={`0 0 ${paper.width} ${paper.height}`}
      className="true-page"
    >
      <svg
        x={MARGIN}
        y={MARGIN}
        width={window.width}
        height={window.height}
        viewBox={`${left} ${top} ${window.width} ${window.height}`}
      >
        <DrawnLines pages={pages} />
        {where &&
          registers.map(([x, y]) => (
            <path
              key={`${x} ${y}`}
              d={`M${x - REGISTER} ${y}h${2 * REGISTER}M${x} ${y - REGISTER}v${2 * REGISTER}`}
              stroke="var(--pencil)"
              strokeWidth={0.13}
            />
          ))}
      </svg>
      <rect
        x={MARGIN}
        y={MARGIN}
        width={window.width}
        height={window.height}
        fill="none"
        stroke="var(--pencil)"
        strokeWidth={0.1}
        strokeDasharray="1 3"
      />
      <path
        d={`M${MARGIN} ${foot + 4}v4M${MARGIN + CHECK} ${foot + 4}v4M${MARGIN} ${foot + 6}h${CHECK}`}
        fill="none"
        stroke="var(--pencil)"
        strokeWidth={0.25}
      />
      <text x={MARGIN + CHECK + 2} y={foot + 7} fontSize={2.8} fill="var(--pencil)">
        100 mm: measure it; print at 100 %, not fitted
      </text>
      <text x={MARGIN} y={foot + 12.5} fontSize={3.2} fill="var(--pencil)">
        {drawing.title}
      </text>
      <text x={paper.width - MARGIN} y={foot + 12.5} fontSize={3.2} fill="var(--pencil)" textAnchor="end">
        {`page ${page.number} of ${pages.pages.length}${where ? `, row ${page.row + 1}, column ${page.column + 1}` : ''}`}
      </text>
    </svg>
  );
}

interface DrawnLinesProps {
  pages: Pages;
  /** one width for all lines, mm; each its own if not given */
  thin?: number;
}

/** The drawing's lines and letters, in its own mm. */
export function DrawnLines({ pages: { drawing }, thin }: DrawnLinesProps) {
  return (
    <>
      {PENS_USED.map((pen) => {
        const { width, dashes } = PENS[pen];
        const path = drawing.strokes
          .filter((stroke) => stroke.pen === pen)
          .map(strokePath)
          .join('');
        return (
          path !== '' && (
            <path
              key={pen}
              d={path}
              fill="none"
              stroke="var(--pencil)"
              strokeWidth={thin ?? width}
              strokeDasharray={thin === undefined ? dashes : undefined}
              strokeLinejoin="round"
            />
          )
        );
      })}
      {drawing.letters.map(({ at: [x, y], text, size, anchor }) => (
        <text key={`${x} ${y}`} x={x} y={y} fontSize={size} textAnchor={anchor} fill="var(--pencil)">
          {text}
        </text>
      ))}
    </>
  );
}
