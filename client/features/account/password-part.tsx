import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { passwordChange, type PasswordChange } from '#shared/schemas/account.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { Part } from './part.tsx';
import { useChangePassword } from './queries.ts';

export function PasswordPart() {
  const change = useChangePassword();
  const say = useToast();
  const { form, field, root, pending } = useSmallForm<PasswordChange>({
    names: ['current', 'password'],
    schema: () => Promise.resolve(passwordChange),
    clears: true,
    send: async (body) => {
      await change.mutateAsync(body);
      say('The password is changed; every other browser is signed out.');
    },
  });
  return (
    <Part title="Password" note="Changing it signs out every browser but this one.">
      <form {...form} className="grid max-w-sm gap-y-1">
        {root && (
          <Notice tone="red" live>
            {root}
          </Notice>
        )}
        <TextField
          {...field('current')}
          label="Present password"
          type="password"
          autoComplete="current-password"
        />
        <TextField
          {...field('password')}
          label="New password"
          type="password"
          autoComplete="new-password"
          hint={`At least ${LIMITS.password.min} characters; a few words in a row do well.`}
        />
        <div>
          <Button type="submit" pending={pending} pendingText="Changing …">
            Change the password
          </Button>
        </div>
      </form>
    </Part>
  );
}
