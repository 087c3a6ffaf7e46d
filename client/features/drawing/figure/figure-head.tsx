import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import type { PlanViewName } from './drawings.ts';

const VIEW_WORDS: Record<PlanViewName, string> = {
  half: 'Surface',
  whole: 'Above',
  side: 'Side',
  front: 'Front',
};
const TOOL =
  'grid min-h-row min-w-row place-items-center rounded-md px-2 text-note text-ink hover:bg-ink-wash ' +
  'aria-disabled:text-graphite aria-disabled:opacity-60 aria-pressed:font-semibold aria-pressed:underline ' +
  'aria-pressed:decoration-2 aria-pressed:underline-offset-4';

interface FigureHeadProps {
  id: string;
  title: string;
  /** scale of the drawing; null where nothing is drawn */
  note: string | null;
  view: PlanViewName;
  views: readonly PlanViewName[];
  onView: (view: PlanViewName) => void;
  side: SideName;
  /** null where both halves are alike */
  onSide: ((side: SideName) => void) | null;
  onZoom: (direction: 1 | -1) => void;
  onFit: () => void;
  fitted: boolean;
  measuring: boolean;
  onMeasuring: (measuring: boolean) => void;
  onPrint: () => void;
  brief: boolean;
}

/** Title and scale of the plan, and how it is looked at. */
export function FigureHead(props: FigureHeadProps) {
  const { id, title, note, view, views, onView, side, onSide, onZoom, onFit, fitted, measuring, brief } =
    props;
  return (
    <figcaption className="flex flex-wrap items-center gap-x-3">
      <span id={id} className="caption mr-auto py-1">
        {note === null ? title : `${title} · ${note}`}
      </span>
      {onSide && (
        <span className="flex flex-wrap" role="group" aria-label="Half">
          {(['starboard', 'port'] as const).map((name) => (
            <button
              key={name}
              type="button"
              aria-pressed={name === side}
              onClick={() => onSide(name)}
              className={TOOL}
            >
              {name === 'port' ? 'Port' : 'Starboard'}
            </button>
          ))}
        </span>
      )}
      <span className="flex flex-wrap" role="group" aria-label="View">
        {views.map((name) => (
          <button
            key={name}
            type="button"
            aria-pressed={name === view}
            onClick={() => onView(name)}
            className={TOOL}
          >
            {VIEW_WORDS[name]}
          </button>
        ))}
      </span>
      <span className="flex flex-wrap" role="group" aria-label="Tools">
        <button
          type="button"
          aria-pressed={measuring}
          title="Measure between two places"
          onClick={() => props.onMeasuring(!measuring)}
          className={TOOL}
        >
          Measure
        </button>
        <button
          type="button"
          title="Print to scale, or save as a file"
          onClick={props.onPrint}
          className={TOOL}
        >
          Print
        </button>
      </span>
      {!brief && (
        <span className="flex flex-wrap" role="group" aria-label="Zoom">
          <Tool label="Smaller" disabled={fitted} onClick={() => onZoom(-1)}>
            −
          </Tool>
          <Tool label="Fit the drawing" disabled={fitted} onClick={onFit}>
            Fit
          </Tool>
          <Tool label="Larger" onClick={() => onZoom(1)}>
            +
          </Tool>
        </span>
      )}
    </figcaption>
  );
}

interface ToolProps {
  label: string;
  disabled?: boolean;
  onClick: () => void;
  children: ReactNode;
}

function Tool({ label, disabled = false, onClick, children }: ToolProps) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      aria-disabled={disabled}
      onClick={disabled ? undefined : onClick}
      className={cn(TOOL, 'text-body')}
    >
      {children}
    </button>
  );
}
