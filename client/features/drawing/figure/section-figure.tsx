import { memo, useId, useMemo } from 'react';
import { layOnPaper, scaleNote, type Margins } from '#client/components/drawing/sheet.ts';
import { Button } from '#client/components/ui/button.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { tipLength } from '#shared/drawing/outline.ts';
import { sectionView } from '#shared/drawing/section-view.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import type { Hover } from '../hover.ts';
import { MeasureNote } from './measure-note.tsx';
import { useMeasure } from './measure.ts';
import { SectionDrawing } from './section-drawing.tsx';
import { sectionWords } from './section-words.ts';
import { StationPicker } from './station-picker.tsx';
import { useSteady } from './use-steady.ts';
import { useZoom } from './use-zoom.ts';

interface SectionFigureProps {
  surface: Surface;
  materials: Plan['materials'];
  side: SideName;
  station: number;
  onStation: (s: number) => void;
  picked: string | null;
  hover: Hover;
  onPick: (line: string) => void;
  measuring: boolean;
  onMeasuring: (measuring: boolean) => void;
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
  const { measuring, onMeasuring } = props;
  const [ref, width] = useWidth<HTMLDivElement>(brief ? 340 : 900);
  const id = useId();
  const units = useUnits();
  const section = useMemo(
    () => sectionView(surface, station, materials, side),
    [surface, station, materials, side],
  );
  const bounds = useSteady(section.chord > 0 ? boundsOf(section.shapes) : null);
  const margins = brief ? BRIEF : MARGINS;
  const { zoom, fit, zoomBy, pan } = useZoom(surface.key);
  const measure = useMeasure(measuring, () => onMeasuring(false));
  const { factor } = zoom;
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
        factor,
      }),
    [bounds, width, margins, maxHeight, factor],
  );
  const numbers = useMemo(() => ribNumbers(surface), [surface]);
  const { title, thick, sentence } = sectionWords(surface, section, numbers, units);
  return (
    <figure aria-labelledby={id} className="min-w-0">
      <figcaption className="flex flex-wrap items-center gap-x-3">
        <span id={id} className="caption mr-auto py-1">
          {paper ? `${title} · ${scaleNote(paper.sheet)}` : title}
        </span>
        {factor > 1 && (
          <Button variant="plain" className="text-note" onClick={fit}>
            Fit the section
          </Button>
        )}
        <StationPicker
          station={section.s}
          ribs={numbers}
          length={surface.panels.reduce((sum, panel) => sum + panel.span, 0) + tipLength(surface, side)}
          onStation={props.onStation}
          label={`Section of the ${surface.key}`}
        />
      </figcaption>
      <div ref={ref} className="min-w-0 overflow-hidden">
        {paper && bounds ? (
          <SectionDrawing
            {...{ section, paper, zoom, measure, thick, sentence, picked, hover, onPick }}
            labelId={id}
            onPan={(dx, dy) => pan(dx, dy, bounds, paper)}
            onZoom={(by, at) => zoomBy(by, at, paper)}
            onFit={fit}
          />
        ) : (
          <p className="py-4 text-graphite">The surface has no chord at this station.</p>
        )}
      </div>
      <MeasureNote measure={measure} view="section" />
    </figure>
  );
});
