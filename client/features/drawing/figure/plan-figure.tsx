import { memo, useId, useMemo, useState } from 'react';
import { useWidth } from '#client/hooks/use-width.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { lineAt, targetsOf } from '#shared/drawing/hit.ts';
import { balanceMarks } from '#shared/drawing/marks.ts';
import { boundsOf, type Point } from '#shared/drawing/shape.ts';
import { useHovered, type Hover } from '../hover.ts';
import { BoardMarks } from './board-marks.tsx';
import { CrossMarks } from './cross-marks.tsx';
import { halfLayers, modelLayers, type Layer, type PlanViewName } from './drawings.ts';
import { FigureHead } from './figure-head.tsx';
import { planSentence, planTitle } from './plan-words.ts';
import { LitLayer, ShapeLayer } from './shape-layer.tsx';
import { FITTED, fromPx, layOnPaper, scaleNote, zoomed, type Margins, type Zoom } from './sheet.ts';
import { SideMarks } from './side-marks.tsx';
import { useDrag } from './use-drag.ts';
import { useSteady } from './use-steady.ts';

export interface PlanFigureProps {
  plan: Plan;
  result: Estimate;
  /** the surface that lies on the board; null while solids or items are at hand */
  surface: Surface | null;
  side: SideName;
  view: PlanViewName;
  onView: (view: PlanViewName) => void;
  /** chooses the half that lies on the board; null where both are alike */
  sides: ((side: SideName) => void) | null;
  picked: string | null;
  hover: Hover;
  onPick: (line: string) => void;
  /** where the section is taken, mm from the root; null without one */
  station: number | null;
  onStation: (s: number) => void;
  maxHeight: number;
  /** a phone: no margins for words */
  brief: boolean;
}

const NO_LAYERS: Layer[] = [];
const MARGINS: Margins = { top: 36, right: 118, bottom: 66, left: 24 };
const BRIEF: Margins = { top: 24, right: 12, bottom: 38, left: 12 };
/** Not larger than one and a half times its size on paper. */
const MAX_SCALE = (1.5 * 96) / 25.4;
/** How near to a thin part the pointer must be, px. */
const REACH = 6;

/** The plan drawn to scale from the numbers of the valid plan. */
export const PlanFigure = memo(function PlanFigure(props: PlanFigureProps) {
  const { plan, result, surface, side, hover, picked, maxHeight, brief, station } = props;
  const view = surface ? props.view : props.view === 'side' ? 'side' : 'whole';
  const [ref, width] = useWidth<HTMLDivElement>(brief ? 340 : 900);
  const [zoom, setZoom] = useState<Zoom>(FITTED);
  const shown = `${view} ${view === 'half' ? (surface?.key ?? '') : ''}`;
  const [zoomedView, setZoomedView] = useState(shown);
  if (zoomedView !== shown) {
    setZoomedView(shown);
    setZoom(FITTED);
  }
  const { materials } = plan;
  const half = useMemo(
    () => (surface ? halfLayers(surface, materials, side) : NO_LAYERS),
    [surface, materials, side],
  );
  // While one half is on the board, the rest of the plan does not matter.
  const model = useMemo(
    () => (view === 'half' ? NO_LAYERS : modelLayers(plan, view === 'side' ? 'side' : 'above')),
    [plan, view],
  );
  const layers = view === 'half' ? half : model;
  const shapes = useMemo(() => layers.flatMap((layer) => layer.shapes), [layers]);
  const targets = useMemo(() => targetsOf(shapes), [shapes]);
  // Equal bounds give the same sheet, so that an edit which moves no outline leaves every other line alone.
  const bounds = useSteady(boundsOf(shapes));
  const margins = brief ? BRIEF : MARGINS;
  const minHeight = brief ? 110 : 170;
  const axes = view === 'side' ? 'elevation' : 'plan';
  const { factor } = zoom;
  const paper = useMemo(
    () =>
      bounds &&
      layOnPaper(bounds, { axes, width, margins, maxHeight, minHeight, maxScale: MAX_SCALE, factor }),
    [bounds, axes, width, margins, maxHeight, minHeight, factor],
  );
  const id = useId();
  const toDrawing = (at: Point): Point | null =>
    paper && fromPx(paper.sheet, [at[0] - zoom.panX, at[1] - zoom.panY]);
  const find = (at: Point) => {
    const point = toDrawing(at);
    return point && paper ? lineAt(targets, point, REACH / paper.sheet.scale) : null;
  };
  const drag = useDrag({
    onPress: (at) => {
      const line = find(at);
      const point = toDrawing(at);
      if (line !== null) props.onPick(line);
      if (view === 'half' && point) props.onStation(Math.abs(point[1]));
    },
    onHover: (at) => hover.set(at && find(at)),
    onDrag: (dx, dy) => {
      if (zoom.factor > 1) setZoom((z) => ({ ...z, panX: z.panX + dx, panY: z.panY + dy }));
    },
  });
  if (!paper || !bounds) {
    return <p className="py-6 text-graphite">Nothing is drawn yet. Add a wing on the left.</p>;
  }
  const { sheet, height } = paper;
  const right = width - margins.right;
  const marks = balanceMarks(plan, result.balance);
  const outside = result.notices.some(({ code }) => code === 'balance_outside_target');
  const common = { marks, percentMac: result.balance.percentMac, outside, sheet, brief };
  return (
    <figure aria-labelledby={`${id}-title`} className="min-w-0">
      <FigureHead
        id={`${id}-title`}
        title={planTitle(view, surface, side, brief)}
        note={scaleNote(sheet)}
        view={view}
        views={surface ? ['half', 'whole', 'side'] : ['whole', 'side']}
        onView={props.onView}
        side={side}
        onSide={view === 'half' ? props.sides : null}
        onZoom={(direction) => setZoom((z) => zoomed(z, direction))}
        onFit={() => setZoom(FITTED)}
        fitted={zoom.factor === 1}
        brief={brief}
      />
      <div ref={ref} className="min-w-0 overflow-hidden">
        <svg
          role="img"
          aria-labelledby={`${id}-sentence`}
          width={width}
          height={height}
          {...drag}
          className={zoom.factor > 1 ? 'block cursor-grab touch-none' : 'block touch-pan-y'}
        >
          <title id={`${id}-sentence`}>{planSentence(plan, result, view, surface)}</title>
          <g transform={`translate(${zoom.panX} ${zoom.panY})`}>
            {layers.map((layer) => (
              <ShapeLayer key={layer.key} shapes={layer.shapes} sheet={sheet} />
            ))}
            <Lit {...{ shapes, sheet, picked, hover }} />
            {view === 'half' && surface && (
              <BoardMarks
                {...{ surface, side, sheet, station, brief }}
                dimensionAt={zoom.factor === 1 && !brief ? height - 26 : null}
              />
            )}
            {view === 'side' ? (
              <SideMarks
                {...common}
                bottom={height - margins.bottom - zoom.panY}
                top={margins.top - zoom.panY}
              />
            ) : (
              <CrossMarks
                {...common}
                wantedPercent={plan.target?.percentMac ?? null}
                left={margins.left - zoom.panX}
                right={right - zoom.panX}
                low={margins.top - 8 - zoom.panY}
                high={height - margins.bottom + 8 - zoom.panY}
              />
            )}
          </g>
        </svg>
      </div>
    </figure>
  );
});

type LitProps = Pick<PlanFigureProps, 'picked' | 'hover'> &
  Omit<Parameters<typeof LitLayer>[0], 'hovered' | 'picked'>;

function Lit({ hover, ...rest }: LitProps) {
  return <LitLayer {...rest} hovered={useHovered(hover)} />;
}
