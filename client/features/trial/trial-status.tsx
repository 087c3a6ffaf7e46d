import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { isUnsent, type TrialDesk } from './trial-desk.ts';

interface TrialStatusProps {
  desk: TrialDesk;
  onRetry: () => void;
  onRead: () => void;
}

/** Whether the trials are on the server, on their way, or only here, and who else changed them. */
export function TrialStatus({ desk, onRetry, onRead }: TrialStatusProps) {
  const { phase, problem, joinedWith } = desk;
  return (
    <div className="space-y-2">
      <p role="status" aria-label="Trials" className="text-note text-graphite">
        {words(desk)}
      </p>
      {problem !== null && (
        <Notice tone="ochre" word="Trials not kept yet">
          {problem}{' '}
          {phase !== 'sending' && (
            <Button variant="plain" onClick={onRetry}>
              Try again
            </Button>
          )}
        </Notice>
      )}
      {joinedWith !== null && (
        <Notice tone="ink" word="Joined">
          These trials were changed by {joinedWith} as well. Both lists are joined; nothing was left out.{' '}
          <Button variant="plain" onClick={onRead}>
            Read
          </Button>
        </Notice>
      )}
    </div>
  );
}

function words(desk: TrialDesk): string {
  if (desk.phase === 'sending') return 'Saving trials …';
  if (isUnsent(desk)) return 'Trials not saved yet';
  const { updatedAt, updatedBy } = desk.base;
  if (updatedAt === null) return 'Trials are kept with the glider as soon as you change one';
  return `Trials saved ${formatMoment(updatedAt)}${updatedBy ? `, ${updatedBy}` : ''}`;
}
