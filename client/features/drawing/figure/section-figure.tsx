import { memo, useId, useMemo } from 'react';
import { useWidth } from '#client/hooks/use-width.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { lineAt, targetsOf } from '#shared/drawing/hit.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { sectionView } from '#shared/drawing/section-view.ts';
import { boundsOf, type Point } from '#shared/drawing/shape.ts';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import { useHovered, type Hover } from '../hover.ts';
import { LitLayer, ShapeLayer } from './shape-layer.tsx';
import { SheetText } from './sheet-text.tsx';
import { fromPx, layOnPaper, scaleNote, toPx, type Margins } from './sheet.ts';
import { StationPicker } from './station-picker.tsx';
import { surfaceTitle } from './plan-words.ts';
import { useDrag } from './use-drag.ts';
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
const MAX_SCALE = (3 * 96) / 25.4;
const REACH = 4;

/** The surface cut at one station, with everything in its place. */
export const SectionFigure = memo(function SectionFigure(props: SectionFigureProps) {
  const { surface, materials, side, station, picked, hover, maxHeight, brief } = props;
  const [ref, width] = useWidth<HTMLDivElement>(brief ? 340 : 900);
  const id = useId();
  const section = useMemo(
    () => sectionView(surface, station, materials, side),
    [surface, station, materials, side],
  );
  const targets = useMemo(() => targetsOf(section.shapes), [section]);
  const bounds = useSteady(boundsOf(section.shapes));
  const margins = brief ? BRIEF : MARGINS;
  const paper = useMemo(
    () =>
      bounds &&
      layOnPaper(bounds, {
        width,
        margins,
        maxHeight,
        axes: 'elevation',
        minHeight: 80,
        maxScale: MAX_SCALE,
      }),
    [bounds, width, margins, maxHeight],
  );
  const numbers = useMemo(() => ribNumbers(surface), [surface]);
  const find = (at: Point) => paper && lineAt(targets, fromPx(paper.sheet, at), REACH / paper.sheet.scale);
  const drag = useDrag({
    onPress: (at) => {
      const line = find(at);
      if (line) props.onPick(line);
    },
    onHover: (at) => hover.set(at && find(at)),
    onDrag: () => undefined,
  });
  if (!paper || section.chord <= 0) {
    return <p className="py-4 text-graphite">The surface has no chord at this station.</p>;
  }
  const { sheet, height } = paper;
  const rib = numbers.findIndex((s) => Math.abs(s - section.s) < 1e-6);
  const where = `${formatQuantity(section.s, 'length')} from the root`;
  const title = rib >= 0 ? `Section at rib ${rib + 1} · ${where}` : `Section · ${where}`;
  const even = section.thicknessAt <= 0 || section.thicknessAt >= 1;
  const thick = `${formatQuantity(section.thickness, 'length')} thick${even ? '' : ` at ${formatQuantity(section.thicknessAt, 'share')}`}`;
  const [[x0], [x1]] = [toPx(sheet, [0, 0]), toPx(sheet, [section.chord, 0])];
  return (
    <figure aria-labelledby={`${id}-title`} className="min-w-0">
      <figcaption className="flex flex-wrap items-center gap-x-3">
        <span id={`${id}-title`} className="caption mr-auto py-1">
          {title} · {scaleNote(sheet)}
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
        <svg
          role="img"
          aria-labelledby={`${id}-sentence`}
          width={width}
          height={height}
          {...drag}
          className="block touch-pan-y"
        >
          <title id={`${id}-sentence`}>
            {`Section of ${surfaceTitle(surface)}, ${where}: chord ${formatQuantity(section.chord, 'length')}, ${thick}${even ? '' : ' of the chord'}${section.rib === null ? ', between ribs' : ''}.`}
          </title>
          <ShapeLayer shapes={section.shapes} sheet={sheet} />
          <Lit shapes={section.shapes} sheet={sheet} picked={picked} hover={hover} />
          <g pointerEvents="none">
            <path
              d={`M${x0} ${height - 26}v10M${x1} ${height - 26}v10M${x0} ${height - 21}H${x1}`}
              stroke="var(--graphite)"
            />
            <SheetText x={(x0 + x1) / 2} y={height - 6} textAnchor="middle">
              {`${formatNumber(section.chord, 1)} · ${thick}`}
            </SheetText>
          </g>
        </svg>
      </div>
    </figure>
  );
});

type LitProps = { hover: Hover } & Omit<Parameters<typeof LitLayer>[0], 'hovered'>;

function Lit({ hover, ...rest }: LitProps) {
  return <LitLayer {...rest} hovered={useHovered(hover)} />;
}
