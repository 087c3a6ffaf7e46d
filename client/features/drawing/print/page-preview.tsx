import type { Pages } from '#shared/drawing/paper/pages.ts';
import { DrawnLines } from './page-sheet.tsx';

const MOST_HIGH = 260;
const MOST_WIDE = 420;

/** The drawing small, with the edges of its pages. */
export function PagePreview({ pages }: { pages: Pages }) {
  const { window, pages: list, drawing } = pages;
  const width = Math.max(drawing.width, ...list.map(({ at }) => at[0] + window.width));
  const height = Math.max(drawing.height, ...list.map(({ at }) => at[1] + window.height));
  const scale = Math.min(MOST_WIDE / width, MOST_HIGH / height);
  const thin = 0.9 / scale;
  return (
    <svg
      aria-hidden="true"
      viewBox={`0 0 ${width} ${height}`}
      width={width * scale}
      height={height * scale}
      className="mx-auto max-w-full"
    >
      <DrawnLines pages={pages} thin={thin} />
      {list.map(({ number, at: [x, y] }) => (
        <g key={number}>
          <rect
            x={x}
            y={y}
            width={window.width}
            height={window.height}
            fill="none"
            stroke="var(--ink)"
            strokeWidth={thin}
            strokeDasharray={`${4 * thin} ${3 * thin}`}
          />
          <text x={x + 8 * thin} y={y + 16 * thin} fontSize={13 * thin} fontWeight={600} fill="var(--ink)">
            {number}
          </text>
        </g>
      ))}
    </svg>
  );
}
