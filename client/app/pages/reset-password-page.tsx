import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { buttonClass } from '#client/components/ui/button.tsx';
import { ResetForm } from '#client/features/session/password-forms.tsx';
import { sessionQuery } from '#client/features/session/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function ResetPasswordPage() {
  useTitle('New password');
  const { token = '' } = useParams();
  const client = useQueryClient();
  const [done, setDone] = useState(false);
  const settle = () => {
    // Every session of the account has ended, this browser's too if it had one.
    void client.invalidateQueries({ queryKey: sessionQuery.queryKey });
    setDone(true);
  };
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">{done ? 'The new password is set' : 'Set a new password'}</h1>
      {done ? (
        <>
          <p className="mt-2" role="status">
            Everybody who was signed in to the account is signed out, you too.
          </p>
          <p className="mt-6">
            <Link to={paths.signIn()} className={buttonClass('primary')}>
              Sign in
            </Link>
          </p>
        </>
      ) : (
        <>
          <p className="mt-1 mb-6 text-graphite">It takes the place of the forgotten one.</p>
          <ResetForm token={token} onDone={settle} />
          <p className="mt-6">
            The link no longer works?{' '}
            <Link to={paths.forgotPassword} className="link">
              Ask for another
            </Link>
          </p>
        </>
      )}
    </SheetPaper>
  );
}
