import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { ForgotForm } from '#client/features/session/password-forms.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function ForgotPasswordPage() {
  useTitle('Forgotten password');
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">Forgotten password</h1>
      <p className="mt-1 mb-6 text-graphite">A link to set a new one comes by e-mail.</p>
      <ForgotForm />
      <p className="mt-6">
        <Link to={paths.signIn()} className="link">
          Back to signing in
        </Link>
      </p>
    </SheetPaper>
  );
}
