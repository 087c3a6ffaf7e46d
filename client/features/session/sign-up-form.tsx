import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { ApiError } from '#client/lib/api.ts';
import { showRefusal } from '#client/lib/form-errors.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { signUp, type SignUp } from '#shared/schemas/session.ts';
import { useSignUp } from './mutations.ts';

export function SignUpForm() {
  const mutation = useSignUp();
  const { register, handleSubmit, setError, formState } = useForm<SignUp>({
    resolver: zodResolver(signUp),
    defaultValues: { name: '', email: '', password: '' },
  });
  const { errors } = formState;

  const submit = handleSubmit((values) =>
    mutation.mutateAsync(values).catch((error: unknown) => {
      if (error instanceof ApiError && error.code === 'email_taken') {
        setError('email', { type: 'server', message: error.message }, { shouldFocus: true });
      } else {
        showRefusal<SignUp>(error, ['name', 'email', 'password'], setError);
      }
    }),
  );
  const { ref: nameRef, ...name } = register('name');
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
        {...name}
        inputRef={nameRef}
        label="Name"
        autoComplete="name"
        hint="Stands on your balance sheets."
        error={errors.name?.message}
      />
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
        autoComplete="new-password"
        hint={`At least ${LIMITS.password.min} characters; a few words in a row do well.`}
        error={errors.password?.message}
      />
      <Button
        type="submit"
        variant="primary"
        className="mt-2"
        pending={formState.isSubmitting}
        pendingText="Signing up …"
      >
        Sign up
      </Button>
    </form>
  );
}
