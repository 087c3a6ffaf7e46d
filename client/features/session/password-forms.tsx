import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { command } from '#client/lib/api.ts';
import { LIMITS } from '#shared/schemas/limits.ts';

/** Asks for a link to set a new password by. The answer is the same for an address that nobody has. */
export function ForgotForm() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const { form, field, root, pending } = useSmallForm<{ email: string }>({
    names: ['email'],
    schema: async () => (await import('#shared/schemas/account.ts')).passwordForgotten,
    send: async (body) => {
      await command('/password-resets', { method: 'POST', body });
      setSentTo(body.email);
    },
  });
  if (sentTo !== null) {
    return (
      <p role="status">
        If <strong className="font-semibold">{sentTo}</strong> has an account, a link is on its way there. It
        is good for one hour and for one use. Look among the unwanted mail too.
      </p>
    );
  }
  return (
    <form {...form} className="flex flex-col gap-2.5">
      {root && (
        <Notice tone="red" live>
          {root}
        </Notice>
      )}
      <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
      <Button type="submit" variant="primary" className="mt-2" pending={pending} pendingText="Sending …">
        Send the link
      </Button>
    </form>
  );
}

interface ResetFormProps {
  token: string;
  onDone: () => void;
}

/** Sets a new password by the mailed link. */
export function ResetForm({ token, onDone }: ResetFormProps) {
  const { form, field, root, pending } = useSmallForm<{ password: string }>({
    names: ['password'],
    schema: async () => (await import('#shared/schemas/account.ts')).passwordReset.pick({ password: true }),
    send: async ({ password }) => {
      await command('/password-resets', { method: 'PUT', body: { token, password } });
      onDone();
    },
  });
  return (
    <form {...form} className="flex flex-col gap-2.5">
      {root && (
        <Notice tone="red" live>
          {root}
        </Notice>
      )}
      <TextField
        {...field('password')}
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${LIMITS.password.min} characters; a few words in a row do well.`}
      />
      <Button type="submit" variant="primary" className="mt-2" pending={pending} pendingText="Setting …">
        Set the password
      </Button>
    </form>
  );
}
