import { Link, NavLink, useLocation, useNavigate } from 'react-router-dom';
import { Mark } from '#client/components/mark.tsx';
import { Menu, MenuChoice, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSignOut } from '#client/features/session/mutations.ts';
import { useUser } from '#client/features/session/queries.ts';
import { useTheme, type Theme } from '#client/hooks/use-theme.ts';
import { cn } from '#client/lib/cn.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { CrumbTrail } from './crumbs.tsx';
import { paths } from './paths.ts';

const ITEM = 'inline-flex min-h-row items-center rounded-md px-2 text-graphite no-underline hover:text-ink';

export function Header() {
  const user = useUser();
  const { pathname } = useLocation();
  const signing = pathname === paths.signIn() || pathname === paths.signUp();
  return (
    <header className="no-print flex min-h-15 items-center gap-x-4 py-2 sm:gap-x-7">
      <Link
        to={user ? paths.bench : paths.home}
        className="flex min-h-row shrink-0 items-center gap-2 text-[1.0625rem] font-bold text-pencil no-underline hover:text-ink"
      >
        <Mark className="size-7" />
        <span>Featherbeam</span>
      </Link>
      <CrumbTrail />
      <div className="ml-auto flex shrink-0 items-center sm:gap-x-3">
        <nav aria-label="Main" className="flex items-center max-sm:hidden sm:gap-x-3">
          <MainLinks user={user} />
        </nav>
        {user === null && !signing && (
          <Link to={paths.signIn()} className={cn(ITEM, 'max-sm:hidden')}>
            Sign in
          </Link>
        )}
        <DeskMenu user={user} />
      </div>
    </header>
  );
}

function MainLinks({ user }: { user: UserDto | null | undefined }) {
  const link = ({ isActive }: { isActive: boolean }) => cn(ITEM, isActive && 'font-semibold text-pencil');
  return (
    <>
      {user ? (
        <NavLink to={paths.bench} className={link}>
          Bench
        </NavLink>
      ) : (
        <NavLink to="/sample" className={link}>
          Sample
        </NavLink>
      )}
      <NavLink to={paths.materials} className={link}>
        Materials
      </NavLink>
    </>
  );
}

const THEMES: readonly { value: Theme; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

/** Theme for everybody; the account for who is signed in; on the phone the main links too. */
function DeskMenu({ user }: { user: UserDto | null | undefined }) {
  const [theme, setTheme] = useTheme();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const say = useToast();
  const leave = () =>
    signOut.mutate(undefined, {
      onSuccess: () => void navigate(paths.home),
      onError: (error) => say(error.message),
    });

  return (
    <Menu
      trigger={
        <button type="button" className={cn(ITEM, 'max-w-40 gap-1.5 border border-rule bg-sheet')}>
          <span className="truncate">{user ? user.name : 'Menu'}</span>
          <svg viewBox="0 0 10 6" width="10" height="6" aria-hidden="true">
            <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.4" />
          </svg>
        </button>
      }
    >
      <div className="sm:hidden">
        {user && <MenuItem onSelect={() => void navigate(paths.bench)}>Bench</MenuItem>}
        {!user && <MenuItem onSelect={() => void navigate(paths.sample())}>Sample glider</MenuItem>}
        <MenuItem onSelect={() => void navigate(paths.materials)}>Materials</MenuItem>
        {!user && <MenuItem onSelect={() => void navigate(paths.signIn())}>Sign in</MenuItem>}
        <MenuLine />
      </div>
      <MenuChoice label="Theme" value={theme} options={THEMES} onValue={setTheme} />
      {user && (
        <>
          <MenuLine />
          <p className="px-3 py-1 text-note text-graphite">{user.email}</p>
          <MenuItem onSelect={leave}>Sign out</MenuItem>
        </>
      )}
    </Menu>
  );
}
