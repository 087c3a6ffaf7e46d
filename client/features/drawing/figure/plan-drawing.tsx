import { useId, useMemo } from 'react';
import { useUnits } from '#client/lib/units.ts';
import { lineAt, targetsOf } from '#shared/drawing/hit.ts';
import { balanceMarks } from '#shared/drawing/marks.ts';
import type { Point, Shape } from '#shared/drawing/shape.ts';
import { BoardMarks } from './board-marks.tsx';
import { CrossMarks } from './cross-marks.tsx';
import type { Layer } from './drawings.ts';
import type { PlanFigureProps } from './plan-figure.tsx';
import { planSentence } from './plan-words.ts';
import { ShapeLayer } from '#client/components/drawing/shape-layer.tsx';
import { LitLayer } from './lit-layer.tsx';
import { fromPx, type Margins, type Sheet, type Zoom } from '#client/components/drawing/sheet.ts';
import { SideMarks } from './side-marks.tsx';
import { useDrag } from './use-drag.ts';

interface PlanDrawingProps extends Omit<PlanFigureProps, 'onView' | 'sides' | 'maxHeight'> {
  layers: readonly Layer[];
  shapes: readonly Shape[];
  paper: { sheet: Sheet; width: number; height: number };
  margins: Margins;
  zoom: Zoom;
  onPan: (dx: number, dy: number) => void;
}

/** How near to a thin part the pointer must be, px. */
const REACH = 6;

/** The plan itself: pencil, marks, and in ink what is picked. A press picks a part and moves the cut. */
export function PlanDrawing(props: PlanDrawingProps) {
  const { plan, result, surface, side, view, picked, hover, station, brief } = props;
  const { layers, shapes, margins, zoom } = props;
  const { sheet, width, height } = props.paper;
  const { panX, panY } = zoom;
  const fitted = zoom.factor === 1;
  const id = useId();
  const units = useUnits();
  const targets = useMemo(() => targetsOf(shapes), [shapes]);
  const toDrawing = (at: Point) => fromPx(sheet, [at[0] - panX, at[1] - panY]);
  const find = (at: Point) => lineAt(targets, toDrawing(at), REACH / sheet.scale);
  const drag = useDrag({
    onPress: (at) => {
      const line = find(at);
      if (line !== null) props.onPick(line);
      if (view === 'half') props.onStation(Math.abs(toDrawing(at)[1]));
    },
    onHover: (at) => hover.set(at && find(at)),
    onDrag: (dx, dy) => {
      if (!fitted) props.onPan(dx, dy);
    },
  });
  const outside = result.notices.some(({ code }) => code === 'balance_outside_target');
  const marks = balanceMarks(plan, result.balance);
  const common = { marks, percentMac: result.balance.percentMac, outside, sheet, brief };
  const bottom = height - margins.bottom - panY;
  return (
    <svg
      role="img"
      aria-labelledby={id}
      width={width}
      height={height}
      {...drag}
      className={fitted ? 'block touch-pan-y' : 'block cursor-grab touch-none'}
    >
      <title id={id}>{planSentence(plan, result, view, surface, units)}</title>
      <g transform={`translate(${panX} ${panY})`}>
        {layers.map((layer) => (
          <ShapeLayer key={layer.key} shapes={layer.shapes} sheet={sheet} />
        ))}
        <LitLayer {...{ shapes, sheet, picked, hover }} />
        {view === 'half' && surface && (
          <BoardMarks
            {...{ surface, side, sheet, station, brief }}
            dimensionAt={fitted && !brief ? height - 26 : null}
          />
        )}
        {view === 'side' ? (
          <SideMarks {...common} bottom={bottom} top={margins.top - panY} />
        ) : (
          <CrossMarks
            {...common}
            wantedPercent={plan.target?.percentMac ?? null}
            left={margins.left - panX}
            right={width - margins.right - panX}
            low={margins.top - 8 - panY}
            high={bottom + 8}
          />
        )}
      </g>
    </svg>
  );
}
