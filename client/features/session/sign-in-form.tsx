import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { showRefusal } from '#client/lib/form-errors.ts';
import { signIn, type SignIn } from '#shared/schemas/session.ts';
import { useSignIn } from './mutations.ts';

export function SignInForm() {
  const mutation = useSignIn();
  const { register, handleSubmit, setError, formState } = useForm<SignIn>({
    resolver: zodResolver(signIn),
    defaultValues: { email: '', password: '' },
  });
  const { errors } = formState;

  const submit = handleSubmit((values) =>
    mutation.mutateAsync(values).catch((error: unknown) => {
      showRefusal<SignIn>(error, ['email', 'password'], setError);
    }),
  );
  const { ref: emailRef, ...email } = register('email');
  const { ref: passwordRef, ...password } = register('password');

  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-2.5">
      {errors.root?.message && (
        <Notice tone="red" live className="mb-2">
          {errors.root.message}
        </Notice>
      )}
      <TextField
        {...email}
        inputRef={emailRef}
        label="E-mail"
        type="email"
        autoComplete="username"
        error={errors.email?.message}
      />
      <TextField
        {...password}
        inputRef={passwordRef}
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
      />
      <Button
        type="submit"
        variant="primary"
        className="mt-2"
        pending={formState.isSubmitting}
        pendingText="Signing in …"
      >
        Sign in
      </Button>
    </form>
  );
}
