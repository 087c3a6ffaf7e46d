import { memo, useId, useMemo, useState } from 'react';
import {
  layOnPaper,
  scaleNote,
  ZOOM_STEP,
  type Laid,
  type Margins,
} from '#client/components/drawing/sheet.ts';
import { useWidth } from '#client/hooks/use-width.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import type { Handle } from '../handles/handle.ts';
import type { Hover } from '../hover.ts';
import { halfLayers, modelLayers, type Layer, type PlanViewName } from './drawings.ts';
import { FigureHead } from './figure-head.tsx';
import { MeasureNote } from './measure-note.tsx';
import { useMeasure } from './measure.ts';
import { PlanDrawing } from './plan-drawing.tsx';
import { planTitle } from './plan-words.ts';
import { useSteady } from './use-steady.ts';
import { useZoom } from './use-zoom.ts';

/** What can be taken hold of, and how that changes the plan. */
export interface Grip {
  handles: readonly Handle[];
  edit: Workspace['edit'];
  undo: () => void;
}

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
  /** null for a reader */
  grip: Grip | null;
  /** told when something is taken hold of and let go */
  onHold: (holding: boolean) => void;
  measuring: boolean;
  onMeasuring: (measuring: boolean) => void;
  onPrint: () => void;
  maxHeight: number;
  /** a phone: no margins for words */
  brief: boolean;
}

const NO_LAYERS: Layer[] = [];
const MARGINS: Margins = { top: 36, right: 118, bottom: 66, left: 24 };
const BRIEF: Margins = { top: 24, right: 12, bottom: 38, left: 12 };
/** Not larger than one and a half times its size on paper. */
const MAX_SCALE = (1.5 * 96) / 25.4;
const MODEL_VIEWS = { whole: 'above', side: 'side', front: 'front' } as const;

/** The plan drawn to scale from the numbers of the valid plan. */
export const PlanFigure = memo(function PlanFigure(props: PlanFigureProps) {
  const { plan, surface, side, maxHeight, brief, measuring, onMeasuring } = props;
  const view = surface || props.view !== 'half' ? props.view : 'whole';
  const [ref, width] = useWidth<HTMLDivElement>(brief ? 340 : 900);
  const { zoom, fit, zoomBy, pan } = useZoom(
    `${view} ${view === 'half' ? (surface?.key ?? '') : ''} ${side}`,
  );
  const measure = useMeasure(measuring, () => onMeasuring(false));
  const { materials } = plan;
  const half = useMemo(
    () => (surface ? halfLayers(surface, materials, side) : NO_LAYERS),
    [surface, materials, side],
  );
  // While one half is on the board, the rest of the plan does not matter.
  const model = useMemo(
    () => (view === 'half' ? NO_LAYERS : modelLayers(plan, MODEL_VIEWS[view])),
    [plan, view],
  );
  const layers = view === 'half' ? half : model;
  const shapes = useMemo(() => layers.flatMap((layer) => layer.shapes), [layers]);
  // Equal bounds give the same sheet, so that an edit which moves no outline leaves every other line alone.
  const bounds = useSteady(boundsOf(shapes));
  const margins = brief ? BRIEF : MARGINS;
  const minHeight = brief ? 110 : 170;
  const axes = view === 'side' || view === 'front' ? 'elevation' : 'plan';
  const { factor } = zoom;
  const fitting = useMemo(
    () =>
      bounds &&
      layOnPaper(bounds, { axes, width, margins, maxHeight, minHeight, maxScale: MAX_SCALE, factor }),
    [bounds, axes, width, margins, maxHeight, minHeight, factor],
  );
  // While something is pulled the paper lies still, or the pointer would lose what it holds.
  const [still, setStill] = useState<Laid | null>(null);
  const paper = still ?? fitting;
  const id = useId();
  return (
    <figure aria-labelledby={`${id}-title`} className="min-w-0">
      <FigureHead
        id={`${id}-title`}
        title={planTitle(view, surface, side, brief)}
        note={paper && scaleNote(paper.sheet)}
        view={view}
        views={surface ? ['half', 'whole', 'side', 'front'] : ['whole', 'side', 'front']}
        onView={props.onView}
        side={side}
        onSide={view === 'half' ? props.sides : null}
        onZoom={(direction) =>
          paper && zoomBy(direction === 1 ? ZOOM_STEP : 1 / ZOOM_STEP, paper.middle, paper)
        }
        onFit={fit}
        fitted={zoom.factor === 1}
        measuring={measuring}
        onMeasuring={onMeasuring}
        onPrint={props.onPrint}
        brief={brief}
      />
      <div ref={ref} className="min-w-0 overflow-hidden">
        {paper && bounds ? (
          <PlanDrawing
            {...props}
            {...{ view, layers, shapes, paper, margins, zoom, measure }}
            labelId={`${id}-title`}
            onPan={(dx, dy) => pan(dx, dy, bounds, paper)}
            onZoom={(by, at) => zoomBy(by, at, paper)}
            onFit={fit}
            onHold={(holding) => {
              setStill(holding ? paper : null);
              props.onHold(holding);
            }}
          />
        ) : (
          <p className="py-6 text-graphite">Nothing is drawn yet. Add a wing with the + beside the list.</p>
        )}
      </div>
      <MeasureNote {...{ measure, view }} />
    </figure>
  );
});
