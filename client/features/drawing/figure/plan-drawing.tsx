import { ShapeLayer } from '#client/components/drawing/shape-layer.tsx';
import { fromPx, toPx, type Laid, type Margins, type Zoom } from '#client/components/drawing/sheet.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Shape, Point } from '#shared/drawing/shape.ts';
import { snapPoint } from '#shared/drawing/snap.ts';
import { HandleLayer } from '../handles/handle-layer.tsx';
import { DrawingFrame } from './drawing-frame.tsx';
import type { Layer } from './drawings.ts';
import { LitLayer } from './lit-layer.tsx';
import { MeasureLayer } from './measure-layer.tsx';
import type { Measure } from './measure.ts';
import type { PlanFigureProps } from './plan-figure.tsx';
import { PlanMarks } from './plan-marks.tsx';
import { planSentence } from './plan-words.ts';
import { useTargets } from './use-targets.ts';

interface PlanDrawingProps extends Omit<PlanFigureProps, 'onView' | 'sides' | 'maxHeight'> {
  labelId: string;
  layers: readonly Layer[];
  shapes: readonly Shape[];
  paper: Laid;
  margins: Margins;
  zoom: Zoom;
  measure: Measure;
  onPan: (dx: number, dy: number) => void;
  onZoom: (by: number, at: Point) => boolean;
  onFit: () => void;
  onHold: (holding: boolean) => void;
}

/** How near to a thin part the pointer must be, px. */
const REACH = 6;
/** How near to a corner a measuring press falls onto it, px. */
const CORNER = 9;

/** The plan itself: pencil, marks, and in ink what is picked. A press picks a part and moves the cut. */
export function PlanDrawing(props: PlanDrawingProps) {
  const { plan, result, surface, side, view, picked, hover, station, brief, grip, measure } = props;
  const { layers, shapes, margins, zoom, paper } = props;
  const { sheet } = paper;
  const { panX, panY } = zoom;
  const units = useUnits();
  const toDrawing = (at: Point) => fromPx(sheet, [at[0] - panX, at[1] - panY]);
  const fromDrawing = (at: Point): Point => {
    const [x, y] = toPx(sheet, at);
    return [x + panX, y + panY];
  };
  const lineNear = useTargets(shapes);
  const find = (at: Point) => lineNear(toDrawing(at), REACH / sheet.scale);
  const overlay = grip && view === 'half' && !measure.on && grip.handles.length > 0 && (
    <HandleLayer
      handles={grip.handles}
      sheet={sheet}
      pan={[panX, panY]}
      side={side}
      edit={grip.edit}
      undo={grip.undo}
      onHold={props.onHold}
    />
  );
  return (
    <DrawingFrame
      paper={paper}
      labelId={props.labelId}
      sentence={planSentence(plan, result, view, surface, units)}
      larger={zoom.factor > 1}
      measure={measure}
      step={units.system === 'inch' ? 25.4 / 16 : 1}
      toDrawing={toDrawing}
      fromDrawing={fromDrawing}
      snap={(at) => snapPoint(shapes, at, CORNER / sheet.scale).at}
      onPress={(at) => {
        const line = find(at);
        if (line !== null) props.onPick(line);
        if (view === 'half') props.onStation(Math.abs(toDrawing(at)[1]));
      }}
      onHover={(at) => hover.set(at && find(at))}
      onPan={props.onPan}
      onZoom={props.onZoom}
      onFit={props.onFit}
      overlay={overlay}
    >
      <g transform={`translate(${panX} ${panY})`}>
        {layers.map((layer) => (
          <ShapeLayer key={layer.key} shapes={layer.shapes} sheet={sheet} />
        ))}
        <LitLayer {...{ shapes, sheet, picked, hover }} />
        <PlanMarks {...{ plan, result, surface, side, view, station, brief, margins, zoom, paper }} />
        <MeasureLayer {...{ measure, view, sheet }} />
      </g>
    </DrawingFrame>
  );
}
