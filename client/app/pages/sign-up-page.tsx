import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { paths, safeNext } from '#client/app/paths.ts';
import { useUser } from '#client/features/session/queries.ts';
import { SignUpForm } from '#client/features/session/sign-up-form.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function SignUpPage() {
  useTitle('Sign up');
  const [search] = useSearchParams();
  const next = search.get('next');
  const user = useUser();
  if (user) return <Navigate to={safeNext(next)} replace />;
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">Sign up</h1>
      <p className="mt-1 mb-6 text-graphite">Your gliders are kept, and save themselves as you type.</p>
      <SignUpForm />
      <p className="mt-6">
        Signed up before?{' '}
        <Link to={paths.signIn(next ?? undefined)} className="link">
          Sign in
        </Link>
      </p>
    </SheetPaper>
  );
}
