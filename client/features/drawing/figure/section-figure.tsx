import { memo, useId, useMemo } from 'react';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { sectionView } from '#shared/drawing/section-view.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import type { Hover } from '../hover.ts';
import { SectionDrawing } from './section-drawing.tsx';
import { sectionWords } from './section-words.ts';
import { layOnPaper, scaleNote, type Margins } from '#client/components/drawing/sheet.ts';
import { StationPicker } from './station-picker.tsx';
import { useSteady } from './use-steady.ts';

interface SectionFigureProps {
  surface: Surface;
  materials: Plan['materials'];
  side: SideName;
  station: number;
  onStation: (s: number) => void;
  picked: string | null;
  hover: Hover;
  onPick: (line: string) => void;
  maxHeight: number;
  brief: boolean;
}

const MARGINS: Margins = { top: 10, right: 118, bottom: 34, left: 24 };
const BRIEF: Margins = { ...MARGINS, right: 12, left: 12 };
/** Not larger than three times its size on paper. */
const MAX_SCALE = (3 * 96) / 25.4;
const MIN_HEIGHT = 80;

/** The surface cut at one station, with everything in its place. */
export const SectionFigure = memo(function SectionFigure(props: SectionFigureProps) {
  const { surface, materials, side, station, picked, hover, onPick, maxHeight, brief } = props;
  const [ref, width] = useWidth<HTMLDivElement>(brief ? 340 : 900);
  const id = useId();
  const units = useUnits();
  const section = useMemo(
    () => sectionView(surface, station, materials, side),
    [surface, station, materials, side],
  );
  const bounds = useSteady(section.chord > 0 ? boundsOf(section.shapes) : null);
  const margins = brief ? BRIEF : MARGINS;
  const paper = useMemo(
    () =>
      bounds &&
      layOnPaper(bounds, {
        axes: 'elevation',
        width,
        margins,
        maxHeight,
        minHeight: MIN_HEIGHT,
        maxScale: MAX_SCALE,
      }),
    [bounds, width, margins, maxHeight],
  );
  const numbers = useMemo(() => ribNumbers(surface), [surface]);
  const { title, thick, sentence } = sectionWords(surface, section, numbers, units);
  return (
    <figure aria-labelledby={id} className="min-w-0">
      <figcaption className="flex flex-wrap items-center gap-x-3">
        <span id={id} className="caption mr-auto py-1">
          {paper ? `${title} · ${scaleNote(paper.sheet)}` : title}
        </span>
        <StationPicker
          station={section.s}
          ribs={numbers}
          length={surface.panels.reduce((sum, panel) => sum + panel.span, 0)}
          onStation={props.onStation}
          label={`Section of the ${surface.key}`}
        />
      </figcaption>
      <div ref={ref} className="min-w-0 overflow-hidden">
        {paper ? (
          <SectionDrawing {...{ section, paper, thick, sentence, picked, hover, onPick }} />
        ) : (
          <p className="py-4 text-graphite">The surface has no chord at this station.</p>
        )}
      </div>
    </figure>
  );
});
