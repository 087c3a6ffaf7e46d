import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { AccountPlace } from '#client/features/account/account-place.tsx';
import { useEnter } from '#client/features/session/mutations.ts';
import { usePreferences } from '#client/features/session/preferences.tsx';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function AccountPage() {
  useTitle('Account');
  const { units, setUnits, theme, setTheme } = usePreferences();
  const navigate = useNavigate();
  const enter = useEnter();
  const signedOut = () => {
    // First away from here: this page would send a visitor to sign in.
    void navigate(paths.home);
    enter({ user: null });
  };
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <AccountPlace
          units={units}
          onUnits={setUnits}
          theme={theme}
          onTheme={setTheme}
          sharingHref={paths.sharing}
          onSignedOut={signedOut}
        />
      </SheetPaper>
    </RequireSession>
  );
}
