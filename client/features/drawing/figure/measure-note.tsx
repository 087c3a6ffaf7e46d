import type { PlanViewName } from './drawings.ts';
import { measureWords, type Measure } from './measure.ts';

interface MeasureNoteProps {
  measure: Measure;
  view: PlanViewName | 'section';
}

/** What has been measured, in words that stay and are spoken; before that, what to do. */
export function MeasureNote({ measure, view }: MeasureNoteProps) {
  const { first, second, done } = measure.state;
  if (!measure.on) return null;
  return (
    <p role="status" className="text-note">
      {first && second && done ? (
        <strong className="font-semibold text-ink">{measureWords(view, first, second).whole}</strong>
      ) : (
        <span className="text-graphite">
          {view === 'section' && !first
            ? ''
            : first
              ? 'Press the second place.'
              : 'Press two places to measure between them; corners are caught.'}
        </span>
      )}
    </p>
  );
}
