import { ShapeLayer } from '#client/components/drawing/shape-layer.tsx';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { fromPx, toPx, type Laid, type Zoom } from '#client/components/drawing/sheet.ts';
import { useUnits } from '#client/lib/units.ts';
import type { SectionView } from '#shared/drawing/section-view.ts';
import type { Point } from '#shared/drawing/shape.ts';
import { snapPoint } from '#shared/drawing/snap.ts';
import type { Hover } from '../hover.ts';
import { DrawingFrame } from './drawing-frame.tsx';
import { LitLayer } from './lit-layer.tsx';
import { MeasureLayer } from './measure-layer.tsx';
import type { Measure } from './measure.ts';
import { useTargets } from './use-targets.ts';

interface SectionDrawingProps {
  section: SectionView;
  labelId: string;
  paper: Laid;
  zoom: Zoom;
  measure: Measure;
  /** thickness, in words */
  thick: string;
  /** the section in a sentence */
  sentence: string;
  picked: string | null;
  hover: Hover;
  onPick: (line: string) => void;
  onPan: (dx: number, dy: number) => void;
  onZoom: (by: number, at: Point) => boolean;
  onFit: () => void;
}

/** How near to a thin part, and to a corner, the pointer must be, px. */
const REACH = 4;
const CORNER = 9;

/** The section itself, with its chord as a dimension under it. */
export function SectionDrawing(props: SectionDrawingProps) {
  const { section, thick, sentence, picked, hover, paper, zoom, measure } = props;
  const { sheet, height } = paper;
  const { shapes, front, chord } = section;
  const { panX, panY } = zoom;
  const units = useUnits();
  const lineNear = useTargets(shapes);
  const toDrawing = (at: Point) => fromPx(sheet, [at[0] - panX, at[1] - panY]);
  const fromDrawing = (at: Point): Point => {
    const [x, y] = toPx(sheet, at);
    return [x + panX, y + panY];
  };
  const find = (at: Point) => lineNear(toDrawing(at), REACH / sheet.scale);
  const [x0, x1] = [toPx(sheet, [front, 0])[0], toPx(sheet, [front + chord, 0])[0]];
  const y = height - 21 - panY;
  return (
    <DrawingFrame
      {...{ paper, sentence, measure, toDrawing, fromDrawing }}
      labelId={props.labelId}
      larger={zoom.factor > 1}
      step={units.system === 'inch' ? 25.4 / 64 : 0.5}
      snap={(at) => snapPoint(shapes, at, CORNER / sheet.scale).at}
      onPress={(at) => {
        const line = find(at);
        if (line !== null) props.onPick(line);
      }}
      onHover={(at) => hover.set(at && find(at))}
      onPan={props.onPan}
      onZoom={props.onZoom}
      onFit={props.onFit}
    >
      <g transform={`translate(${panX} ${panY})`}>
        <ShapeLayer shapes={shapes} sheet={sheet} />
        <LitLayer cut {...{ shapes, sheet, picked, hover }} />
        <g pointerEvents="none">
          <path d={`M${x0} ${y - 5}v10M${x1} ${y - 5}v10M${x0} ${y}H${x1}`} stroke="var(--graphite)" />
          <SheetText x={(x0 + x1) / 2} y={y + 15} textAnchor="middle">
            {`${units.format(chord, 'length', { bare: true })} · ${thick}`}
          </SheetText>
        </g>
        <MeasureLayer {...{ measure, sheet }} view="section" />
      </g>
    </DrawingFrame>
  );
}
