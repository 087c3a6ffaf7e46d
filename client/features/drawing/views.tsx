import { useCallback, useEffect, useRef, useState } from 'react';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import type { Tab } from './edits/line-id.ts';
import type { PlanViewName } from './figure/drawings.ts';
import { PlanFigure } from './figure/plan-figure.tsx';
import { SectionFigure } from './figure/section-figure.tsx';
import type { Hover } from './hover.ts';
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
  picked: string | null;
  onPick: (line: string | null) => void;
  hover: Hover;
  narrow: boolean;
}

const within = (low: number, value: number, high: number) => Math.max(low, Math.min(high, value));

/** Plan and section of what is at hand. */
export function Views(props: ViewsProps) {
  const { plan, stale, result, tab, station, picked, hover, narrow } = props;
  const [view, setView] = useState<PlanViewName>('half');
  const [side, setSide] = useState<SideName>('starboard');
  const height = useViewportHeight();
  const onPick = useLatest((line: string) => props.onPick(line));
  const onStation = useLatest((s: number) => props.onStation(s));
  if (!plan) {
    return (
      <p className="py-6 text-graphite">
        The plan as it was opened is not valid. It is drawn once what is marked in red has been mended.
      </p>
    );
  }
  const surface = (tab.kind === 'surface' && plan.surfaces[tab.index]) || null;
  const length = surface?.panels.reduce((sum, panel) => sum + panel.span, 0) ?? 0;
  const cut = surface ? within(0, station, length) : null;
  const oneSided =
    surface?.mirrored && surface.parts.some((p) => p.side === 'port' || p.side === 'starboard');
  const half = oneSided ? side : 'starboard';
  const common = { picked, hover, side: half, brief: narrow } as const;
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
          sides={oneSided ? setSide : null}
          onPick={onPick}
          station={cut}
          onStation={onStation}
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

/** The same function for ever, which does what the latest one does; so that drawings need not render for it. */
function useLatest<A>(fn: (a: A) => void): (a: A) => void {
  const latest = useRef(fn);
  useEffect(() => {
    latest.current = fn;
  });
  return useCallback((a: A) => latest.current(a), []);
}
