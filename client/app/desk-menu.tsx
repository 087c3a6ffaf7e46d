import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Menu, MenuChoice, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { UnitsDialog } from '#client/features/account/units-dialog.tsx';
import { useSignOut } from '#client/features/session/mutations.ts';
import { usePreferences } from '#client/features/session/preferences.tsx';
import type { Theme } from '#shared/schemas/preferences.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { DeskButton } from './desk-button.tsx';
import { paths } from './paths.ts';

const THEMES: readonly { value: Theme; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

/** Units and theme for everybody; the account for who is signed in; on the phone the main links too. */
export function DeskMenu({ user }: { user: UserDto | null | undefined }) {
  const { units, setUnits, theme, setTheme } = usePreferences();
  const [choosing, setChoosing] = useState(false);
  const signOut = useSignOut();
  const navigate = useNavigate();
  const say = useToast();
  const leave = () =>
    signOut.mutate(undefined, {
      onSuccess: () => void navigate(paths.home),
      onError: (error) => say(error.message),
    });

  return (
    <>
      <Menu defaultOpen trigger={<DeskButton user={user} />}>
        <div className="sm:hidden">
          {user && <MenuItem onSelect={() => void navigate(paths.bench)}>Bench</MenuItem>}
          {!user && <MenuItem onSelect={() => void navigate(paths.sample())}>Sample glider</MenuItem>}
          {user && <MenuItem onSelect={() => void navigate(paths.rack)}>Rack</MenuItem>}
          <MenuItem onSelect={() => void navigate(paths.materials)}>Materials</MenuItem>
          {!user && <MenuItem onSelect={() => void navigate(paths.signIn())}>Sign in</MenuItem>}
          <MenuLine />
        </div>
        <MenuChoice label="Theme" value={theme} options={THEMES} onValue={setTheme} />
        <MenuLine />
        <MenuItem onSelect={() => setChoosing(true)}>Units and numbers …</MenuItem>
        {user && (
          <>
            <MenuLine />
            <p className="px-3 py-1 text-note text-graphite">{user.email}</p>
            <MenuItem onSelect={() => void navigate(paths.account)}>Account</MenuItem>
            <MenuItem onSelect={leave}>Sign out</MenuItem>
          </>
        )}
      </Menu>
      <UnitsDialog open={choosing} onOpenChange={setChoosing} units={units} onUnits={setUnits} />
    </>
  );
}
