import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { ApiError } from '#client/lib/api.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { SignUp } from '#shared/schemas/session.ts';
import { useSignUp } from './mutations.ts';

export function SignUpForm() {
  const { mutateAsync } = useSignUp();
  const { form, field, root, pending } = useSmallForm<SignUp>({
    names: ['name', 'email', 'password'],
    schema: async () => (await import('#shared/schemas/session.ts')).signUp,
    send: mutateAsync,
    blame: (error) => (error instanceof ApiError && error.code === 'email_taken' ? 'email' : null),
  });
  return (
    <form {...form} className="flex flex-col gap-2.5">
      {root && (
        <Notice tone="red" live className="mb-2">
          {root}
        </Notice>
      )}
      <TextField {...field('name')} label="Name" autoComplete="name" hint="Stands on your balance sheets." />
      <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
      <TextField
        {...field('password')}
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${LIMITS.password.min} characters; a few words in a row do well.`}
      />
      <Button type="submit" variant="primary" className="mt-2" pending={pending} pendingText="Signing up …">
        Sign up
      </Button>
    </form>
  );
}
