import { Link, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { useUser } from '#client/features/session/queries.ts';
import { VerifyEmail } from '#client/features/session/verify-email.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function VerifyEmailPage() {
  useTitle('Confirm the address');
  const { token = '' } = useParams();
  const user = useUser();
  const links = (
    <p className="mt-6 flex gap-4">
      {user ? (
        <>
          <Link to={paths.bench} className="link">
            To the bench
          </Link>
          <Link to={paths.account} className="link">
            To the account
          </Link>
        </>
      ) : (
        <Link to={paths.signIn(paths.account)} className="link">
          Sign in
        </Link>
      )}
    </p>
  );
  return (
    <SheetPaper narrow>
      <VerifyEmail token={token} links={links} />
    </SheetPaper>
  );
}
