import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { ApiError } from '#client/lib/api.ts';
import { formatMoment } from '#client/lib/moments.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type { InvitationPreviewDto } from '#shared/schemas/sharing.ts';
import { useAccept, useDecline } from './mutations.ts';
import { sharingQueries } from './queries.ts';
import { roleMay } from './role-words.ts';

interface InvitationPlaceProps {
  token: string;
  user: UserDto | null;
  signInHref: string;
  signUpHref: string;
  benchHref: string;
  onAccepted: (gliderId: string) => void;
}

/** What an invitation offers, to take or to refuse; who has no account gets one first. */
export function InvitationPlace(props: InvitationPlaceProps) {
  const query = useQuery(sharingQueries.preview(props.token));
  if (query.error instanceof ApiError && query.error.code === 'link_dead') return <Dead {...props} />;
  return <QueryView query={query}>{(preview) => <Open {...props} preview={preview} />}</QueryView>;
}

function Open(props: InvitationPlaceProps & { preview: InvitationPreviewDto }) {
  const { token, user, preview, signInHref, signUpHref, onAccepted } = props;
  const { gliderName, invitedBy, email, role, expiresAt } = preview;
  const accept = useAccept();
  const decline = useDecline();
  const [declined, setDeclined] = useState(false);
  const say = useToast();
  if (declined) {
    return (
      <>
        <h1 className="text-figure font-semibold">Declined</h1>
        <p className="mt-2">{invitedBy} can invite you again. This link no longer works.</p>
      </>
    );
  }
  const take = () =>
    void accept.mutateAsync(token).then(
      ({ gliderId }) => {
        say(`${gliderName} lies on your bench.`);
        onAccepted(gliderId);
      },
      () => undefined,
    );
  const refuse = () =>
    void decline.mutateAsync(token).then(
      () => setDeclined(true),
      () => undefined,
    );
  const trouble = accept.error ?? decline.error;
  return (
    <>
      <h1 className="text-figure font-semibold">
        {invitedBy} invites you to {gliderName}
      </h1>
      <p className="mt-2">
        as its <strong className="font-semibold">{role}</strong>, who {roleMay(role)}.
      </p>
      <p className="mt-2 text-note text-graphite">
        Sent to {email}, good until <time dateTime={expiresAt}>{formatMoment(expiresAt)}</time>.
        {user &&
          user.email !== email &&
          ` You are signed in as ${user.email}; the glider comes to that bench.`}
      </p>
      {trouble && (
        <Notice tone="red" live className="mt-4">
          {trouble.message}
        </Notice>
      )}
      <div className="mt-6 flex flex-wrap gap-3">
        {user ? (
          <Button variant="primary" onClick={take} pending={accept.isPending}>
            Accept
          </Button>
        ) : (
          <>
            <Link to={signUpHref} className={buttonClass('primary')}>
              Sign up to accept
            </Link>
            <Link to={signInHref} className={buttonClass('quiet')}>
              Sign in to accept
            </Link>
          </>
        )}
        <Button variant="plain" onClick={refuse} pending={decline.isPending}>
          Decline
        </Button>
      </div>
    </>
  );
}

function Dead({ user, benchHref }: Pick<InvitationPlaceProps, 'user' | 'benchHref'>) {
  return (
    <>
      <h1 className="text-figure font-semibold">This invitation no longer works</h1>
      <p className="mt-2">
        It was used, withdrawn or has run out; a newer one may have taken its place. Ask whoever invited you
        for another.
      </p>
      {user && (
        <p className="mt-5">
          <Link to={benchHref} className="link">
            To the bench
          </Link>
        </p>
      )}
    </>
  );
}
