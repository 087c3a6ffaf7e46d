import { Button } from '#client/components/ui/button.tsx';
import { useDelayed } from '#client/hooks/use-delayed.ts';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import type { FiguresTask } from './tasks.ts';
import type { Drawing } from './use-drawing.ts';

/** How far the draws have come, with a way to stop them; a line of one height, so that nothing jumps. */
export function DrawsState({ drawing, draws }: { drawing: Drawing<FiguresTask>; draws: number }) {
  const { working, done, answer, problem, stopped, stop, resume } = drawing;
  const late = useDelayed(working);
  const before = answer ? ' The figures shown are those of before.' : '';
  const text = late
    ? `Drawing ${formatNumber(draws, 0)} times: ${formatQuantity(done, 'share')}.`
    : stopped
      ? `Stopped.${before}`
      : problem
        ? `The draws failed: ${problem}${before}`
        : '';
  return (
    <div className="mt-2 flex min-h-row flex-wrap items-center gap-3 text-note print:hidden">
      <p role="status" className={problem ? 'text-red' : 'text-graphite'}>
        {problem && <span aria-hidden="true">▲ </span>}
        {text}
      </p>
      {late && (
        <>
          <progress aria-label="Draws done" max={1} value={done} className="h-2 w-40 accent-ink" />
          <Button variant="plain" onClick={stop}>
            Stop
          </Button>
        </>
      )}
      {(stopped || problem) && (
        <Button variant="plain" onClick={resume}>
          Draw
        </Button>
      )}
    </div>
  );
}
