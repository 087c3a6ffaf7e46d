import { useMemo } from 'react';
import { layOnPaper, pathOf, toPx } from '#client/components/drawing/sheet.ts';
import { readSection, selfCrossingAt } from '#shared/core/section.ts';
import { contourOf } from '#shared/drawing/contour.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import type { ReadSection } from '#shared/sections/read-section.ts';
import { noteWords } from './section-findings.ts';

const WIDTH = 620;
/** With more points than this each is not shown by itself. */
const DOTTED = 160;

/** A section as it was read: drawn, with its points, and what was mended. */
export function SectionPreview({ section: { points, notes } }: { section: ReadSection }) {
  const drawn = useMemo(() => {
    const section = readSection({ name: '', points }, 1);
    const contour = contourOf({ section, chord: 1 });
    const bounds = boundsOf([{ points: contour }]);
    return { contour, bounds, crossing: selfCrossingAt(section) };
  }, [points]);
  const { contour, bounds, crossing } = drawn;
  if (!bounds) return null;
  const { sheet, height } = layOnPaper(bounds, {
    axes: 'elevation',
    width: WIDTH,
    margins: { top: 8, right: 8, bottom: 8, left: 8 },
    maxHeight: 150,
    minHeight: 50,
  });
  const dots = points.length <= DOTTED ? points : [];
  return (
    <div>
      <svg viewBox={`0 0 ${WIDTH} ${height}`} aria-hidden="true" className="w-full">
        <path d={pathOf(sheet, contour, true)} fill="var(--wood-light)" stroke="var(--pencil)" />
        {dots.map((point, i) => {
          const [x, y] = toPx(sheet, point);
          return <circle key={i} cx={x} cy={y} r={1.6} fill="var(--pencil)" />;
        })}
      </svg>
      <p role="status" className="text-note text-graphite">
        {crossing !== null && (
          <strong className="block font-semibold text-red">
            ▲ The two faces cross at {formatQuantity(crossing, 'share')} of the chord.
          </strong>
        )}
        {[`${points.length} points.`, ...notes.map(noteWords)].join(' ')}
      </p>
    </div>
  );
}
