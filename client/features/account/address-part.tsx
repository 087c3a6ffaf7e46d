import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { ApiError } from '#client/lib/api.ts';
import { emailChange, type AccountDto, type EmailChange } from '#shared/schemas/account.ts';
import { Part } from './part.tsx';
import { useChangeEmail, useVerifyAgain } from './queries.ts';

/** The address, whether it is confirmed, and a change of it. */
export function AddressPart({ account }: { account: AccountDto }) {
  const [changing, setChanging] = useState(false);
  const { email, verified, pendingEmail } = account;
  return (
    <Part
      title="E-mail"
      note="You sign in with it. Invitations can be sent once it is confirmed. A new address takes its place when the link that is mailed there has been followed."
    >
      <p>
        <span className="font-semibold">{email}</span>
        <span className="text-graphite">{verified ? ', confirmed' : ', not confirmed yet'}</span>
      </p>
      {pendingEmail !== null && (
        <ToConfirm>
          <strong className="font-semibold">{pendingEmail}</strong> is to take its place: follow the link that
          was mailed there.
        </ToConfirm>
      )}
      {pendingEmail === null && !verified && (
        <ToConfirm>Follow the link that was mailed there to confirm it.</ToConfirm>
      )}
      {changing ? (
        <AddressForm onDone={() => setChanging(false)} />
      ) : (
        <Button className="mt-3" onClick={() => setChanging(true)}>
          Change the address …
        </Button>
      )}
    </Part>
  );
}

function ToConfirm({ children }: { children: React.ReactNode }) {
  const again = useVerifyAgain();
  const say = useToast();
  const send = () =>
    void again.mutateAsync().then(
      () => say('The link is on its way again.'),
      (error: Error) => say(error.message),
    );
  return (
    <Notice
      tone="ink"
      className="mt-3"
      actions={
        <Button variant="plain" pending={again.isPending} pendingText="Sending …" onClick={send}>
          Send it again
        </Button>
      }
    >
      {children}
    </Notice>
  );
}

function AddressForm({ onDone }: { onDone: () => void }) {
  const change = useChangeEmail();
  const say = useToast();
  const { form, field, root, pending } = useSmallForm<EmailChange>({
    names: ['email', 'password'],
    schema: () => Promise.resolve(emailChange),
    send: async (body) => {
      await change.mutateAsync(body);
      say(`A link is on its way to ${body.email}.`);
      onDone();
    },
    blame: (error) => (error instanceof ApiError && error.code === 'email_taken' ? 'email' : null),
  });
  return (
    <form {...form} className="mt-3 grid max-w-sm gap-y-1">
      {root && (
        <Notice tone="red" live>
          {root}
        </Notice>
      )}
      <TextField {...field('email')} label="New address" type="email" autoComplete="email" />
      <TextField
        {...field('password')}
        label="Your password"
        type="password"
        autoComplete="current-password"
      />
      <div className="flex gap-3">
        <Button type="submit" variant="primary" pending={pending} pendingText="Sending …">
          Send the link
        </Button>
        <Button onClick={onDone}>Cancel</Button>
      </div>
    </form>
  );
}
