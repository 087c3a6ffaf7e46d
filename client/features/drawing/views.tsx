import { useDeferredValue, useMemo, useState } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Tab } from './edits/line-id.ts';
import { PlanFigure, type Grip } from './figure/plan-figure.tsx';
import { SectionFigure } from './figure/section-figure.tsx';
import { handlesOf } from './handles/handles-of.ts';
import type { Hover } from './hover.ts';
import { useLatest } from './use-latest.ts';
import { cutAt, type Looking } from './use-looking.ts';
import { useViewportHeight } from './use-viewport-height.ts';

interface ViewsProps {
  /** the last valid plan; null where there has been none */
  plan: Plan | null;
  /** what is being edited is not valid, and something older is drawn */
  stale: boolean;
  result: Estimate;
  tab: Tab;
  station: number;
  onStation: (s: number) => void;
  looking: Looking;
  onPrint: () => void;
  picked: string | null;
  onPick: (line: string | null) => void;
  /** null for a reader */
  edit: Workspace['edit'] | null;
  undo: () => void;
  hover: Hover;
  narrow: boolean;
}

const within = (low: number, value: number, high: number) => Math.max(low, Math.min(high, value));

/**
 * Plan and section of what is at hand. After a key the figures answer first and the lines follow as soon as the
 * browser is free; what is pulled by hand is drawn at once, or it would slip from the hand.
 */
export function Views(props: ViewsProps) {
  const { stale, tab, station, picked, hover, narrow } = props;
  const [holding, setHolding] = useState(false);
  const now = useMemo(() => ({ plan: props.plan, result: props.result }), [props.plan, props.result]);
  const soon = useDeferredValue(now);
  const { plan, result } = holding ? now : soon;
  const { view, setView, side, setSide, measuring, setMeasuring } = props.looking;
  const height = useViewportHeight();
  const onPick = useLatest((line: string) => props.onPick(line));
  const onStation = useLatest((s: number) => props.onStation(s));
  const onPrint = useLatest(() => props.onPrint());
  const edit = useLatest<Workspace['edit']>((recipe, what) => props.edit?.(recipe, what));
  const undo = useLatest(() => props.undo());
  const index = tab.kind === 'surface' ? tab.index : -1;
  const surface = plan?.surfaces[index] ?? null;
  const editable = props.edit !== null && !stale;
  const grip = useMemo(
    (): Grip | null =>
      surface && editable ? { handles: handlesOf(surface, index, picked), edit, undo } : null,
    [surface, editable, index, picked, edit, undo],
  );
  if (!plan) {
    return (
      <p className="py-6 text-graphite">
        The plan as it was opened is not valid. It is drawn once what is marked in red has been mended.
      </p>
    );
  }
  const half = surface?.mirrored ? side : 'starboard';
  const cut = surface && cutAt(surface, half, station);
  const common = { picked, hover, side: half, brief: narrow, measuring, onMeasuring: setMeasuring } as const;
  return (
    <>
      <div
        className={
          narrow
            ? 'z-20 -mx-4 border-b border-rule bg-sheet px-4 py-1 [@media(min-height:36rem)]:sticky [@media(min-height:36rem)]:top-0'
            : ''
        }
      >
        <PlanFigure
          {...common}
          plan={plan}
          result={result}
          surface={surface}
          view={view}
          onView={setView}
          sides={surface?.mirrored ? setSide : null}
          onPick={onPick}
          station={cut}
          onStation={onStation}
          grip={grip}
          onHold={setHolding}
          onPrint={onPrint}
          maxHeight={
            narrow
              ? within(150, height * 0.28, 260)
              : within(240, height * (!surface ? 0.6 : view === 'half' ? 0.46 : 0.52), 560)
          }
        />
        {stale && (
          <p role="status" className="text-note text-ochre">
            <span aria-hidden="true">◆ </span>
            Drawn is the last valid plan.
          </p>
        )}
      </div>
      {surface && cut !== null && (
        <SectionFigure
          {...common}
          surface={surface}
          materials={plan.materials}
          station={cut}
          onStation={onStation}
          onPick={onPick}
          maxHeight={narrow ? 150 : within(120, height * 0.22, 230)}
        />
      )}
    </>
  );
}
