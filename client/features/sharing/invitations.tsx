import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { ApiError } from '#client/lib/api.ts';
import { formatMoment } from '#client/lib/moments.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { invitationInput, type InvitationDto, type InvitationInput } from '#shared/schemas/sharing.ts';
import { useInvite, useRevoke } from './mutations.ts';
import { Part } from './part.tsx';
import { sharingQueries } from './queries.ts';
import { ROLE_OPTIONS, roleMay, roleName } from './role-words.ts';

interface InvitationsProps {
  gliderId: string;
  accountHref: string;
}

/** Invites by e-mail, and what was sent and not answered yet. */
export function Invitations({ gliderId, accountHref }: InvitationsProps) {
  const query = useQuery(sharingQueries.invitations(gliderId));
  return (
    <Part
      title="Invite somebody"
      note="They get a link by e-mail that is good for 14 days. Inviting the same address again sends a new link; the old one no longer works."
    >
      <InviteForm gliderId={gliderId} accountHref={accountHref} />
      <QueryView query={query} isEmpty={({ invitations }) => invitations.length === 0} empty={null}>
        {({ invitations }) => (
          <>
            <h3 className="caption mt-4">Not answered yet</h3>
            <ul>
              {invitations.map((invitation) => (
                <Pending key={invitation.id} gliderId={gliderId} invitation={invitation} />
              ))}
            </ul>
          </>
        )}
      </QueryView>
    </Part>
  );
}

function InviteForm({ gliderId, accountHref }: InvitationsProps) {
  const invite = useInvite(gliderId);
  const say = useToast();
  const { form, field, root, pending } = useSmallForm<InvitationInput>({
    names: ['email', 'role'],
    schema: () => Promise.resolve(invitationInput),
    clears: true,
    send: async (input) => {
      const { email } = await invite.mutateAsync(input);
      say(`The invitation is on its way to ${email}.`);
    },
    blame: (error) => (error instanceof ApiError && error.code === 'already_member' ? 'email' : null),
  });
  const unverified = invite.error instanceof ApiError && invite.error.code === 'email_unverified';
  return (
    <form {...form}>
      {root && (
        <Notice
          tone="red"
          live
          className="mb-2"
          actions={
            unverified && (
              <Link to={accountHref} className="link">
                To the account
              </Link>
            )
          }
        >
          {root}
        </Notice>
      )}
      <div className="flex flex-wrap items-start gap-x-4">
        <div className="min-w-[min(14rem,100%)] flex-1">
          <TextField
            {...field('email')}
            label="E-mail"
            type="email"
            autoComplete="off"
            maxLength={LIMITS.email.max}
          />
        </div>
        <div className="w-36">
          <Select {...field('role')} label="as" options={ROLE_OPTIONS} defaultValue="builder" />
        </div>
        <Button
          type="submit"
          variant="primary"
          className="sm:mt-[1.375rem]"
          pending={pending}
          pendingText="Sending …"
        >
          Invite
        </Button>
      </div>
      <ul className="text-note text-graphite">
        {ROLE_OPTIONS.map(({ value, label }) => (
          <li key={value}>
            <strong className="font-semibold">{label}</strong> {roleMay(value)}.
          </li>
        ))}
      </ul>
    </form>
  );
}

function Pending({ gliderId, invitation }: { gliderId: string; invitation: InvitationDto }) {
  const revoke = useRevoke(gliderId);
  const say = useToast();
  const { id, email, role, expiresAt } = invitation;
  const withdraw = () =>
    void revoke.mutateAsync(id).then(
      () => say(`The invitation to ${email} is withdrawn; its link no longer works.`),
      (error: Error) => say(error.message),
    );
  return (
    <li className="flex min-h-row flex-wrap items-center gap-x-3 border-b border-rule py-1">
      <span className="min-w-0 flex-1">
        <span className="font-semibold">{email}</span> as {roleName(role).toLowerCase()}
        <span className="block text-note text-graphite">
          good until <time dateTime={expiresAt}>{formatMoment(expiresAt)}</time>
        </span>
      </span>
      <Button
        variant="plain"
        aria-label={`Withdraw the invitation to ${email}`}
        pending={revoke.isPending}
        onClick={withdraw}
      >
        Withdraw
      </Button>
    </li>
  );
}
