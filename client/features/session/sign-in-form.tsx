import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import type { SignIn } from '#shared/schemas/session.ts';
import { useSignIn } from './mutations.ts';

export function SignInForm() {
  const { mutateAsync } = useSignIn();
  const { form, field, root, pending } = useSmallForm<SignIn>({
    names: ['email', 'password'],
    schema: async () => (await import('#shared/schemas/session.ts')).signIn,
    send: mutateAsync,
  });
  return (
    <form {...form} className="flex flex-col gap-2.5">
      {root && (
        <Notice tone="red" live className="mb-2">
          {root}
        </Notice>
      )}
      <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
      <TextField {...field('password')} label="Password" type="password" autoComplete="current-password" />
      <Button type="submit" variant="primary" className="mt-2" pending={pending} pendingText="Signing in …">
        Sign in
      </Button>
    </form>
  );
}
