import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { paths, safeNext } from '#client/app/paths.ts';
import { useUser } from '#client/features/session/queries.ts';
import { SignInForm } from '#client/features/session/sign-in-form.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function SignInPage() {
  useTitle('Sign in');
  const [search] = useSearchParams();
  const next = search.get('next');
  const user = useUser();
  if (user) return <Navigate to={safeNext(next)} replace />;
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">Sign in</h1>
      <p className="mt-1 mb-6 text-graphite">to your bench and its gliders.</p>
      <SignInForm />
      <p className="mt-4">
        <Link to={paths.forgotPassword} className="link">
          Forgotten password?
        </Link>
      </p>
      <p className="mt-3">
        No account yet?{' '}
        <Link to={paths.signUp(next ?? undefined)} className="link">
          Sign up
        </Link>
        , or{' '}
        <Link to={paths.sample()} className="link">
          try the sample glider
        </Link>{' '}
        without one.
      </p>
    </SheetPaper>
  );
}
