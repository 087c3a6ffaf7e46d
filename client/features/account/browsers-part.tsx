import { useQuery } from '@tanstack/react-query';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { AccountSessionDto } from '#shared/schemas/account.ts';
import { Part } from './part.tsx';
import { accountSessionsQuery, useEndOtherSessions, useEndSession } from './queries.ts';

/** Where the account is signed in, each to be ended. */
export function BrowsersPart({ onSignedOut }: { onSignedOut: () => void }) {
  const query = useQuery(accountSessionsQuery);
  const endOthers = useEndOtherSessions();
  const say = useToast();
  const end = () =>
    void endOthers.mutateAsync(undefined).then(
      () => say('Every other browser is signed out.'),
      (error: Error) => say(error.message),
    );
  return (
    <Part title="Signed in" note="One you do not know? Sign it out and change the password.">
      <QueryView query={query}>
        {({ sessions }) => (
          <>
            <ul className="border-t border-rule">
              {sessions.map((session) => (
                <Browser key={session.id} session={session} onSignedOut={onSignedOut} />
              ))}
            </ul>
            {sessions.length > 1 && (
              <Button className="mt-3" pending={endOthers.isPending} onClick={end}>
                Sign out all the others
              </Button>
            )}
          </>
        )}
      </QueryView>
    </Part>
  );
}

interface BrowserProps {
  session: AccountSessionDto;
  onSignedOut: () => void;
}

function Browser({ session, onSignedOut }: BrowserProps) {
  const { id, device, current, createdAt, lastUsedAt } = session;
  const endSession = useEndSession();
  const say = useToast();
  const end = () =>
    void endSession.mutateAsync(id).then(
      () => (current ? onSignedOut() : say(`${device} is signed out.`)),
      (error: Error) => say(error.message),
    );
  return (
    <li className="flex min-h-row flex-wrap items-center gap-x-4 border-b border-rule py-1">
      <span className="min-w-0 flex-1">
        <span className="font-semibold">{device}</span>
        {current && <span className="text-graphite">, this one</span>}
        <span className="block text-note text-graphite">
          since <time dateTime={createdAt}>{formatMoment(createdAt)}</time>, last used{' '}
          <time dateTime={lastUsedAt}>{formatMoment(lastUsedAt)}</time>
        </span>
      </span>
      <Button
        variant="plain"
        aria-label={current ? 'Sign out here' : `Sign out ${device}`}
        pending={endSession.isPending}
        onClick={end}
      >
        Sign out
      </Button>
    </li>
  );
}
