import { Link, NavLink, useLocation } from 'react-router-dom';
import { Mark } from '#client/components/mark.tsx';
import { useUser } from '#client/features/session/queries.ts';
import { cn } from '#client/lib/cn.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { CrumbTrail } from './crumbs.tsx';
import { DeskMenuWhenWanted } from './desk-button.tsx';
import { paths } from './paths.ts';

const ITEM = 'inline-flex min-h-row items-center rounded-md px-2 text-graphite no-underline hover:text-ink';

export function Header() {
  const user = useUser();
  const { pathname } = useLocation();
  const signing = pathname === paths.signIn() || pathname === paths.signUp();
  return (
    <header className="no-print flex min-h-15 flex-wrap items-center gap-x-4 py-2 sm:gap-x-7">
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
        <DeskMenuWhenWanted user={user} />
      </div>
    </header>
  );
}

function MainLinks({ user }: { user: UserDto | null | undefined }) {
  const link = ({ isActive }: { isActive: boolean }) => cn(ITEM, isActive && 'font-semibold text-pencil');
  return (
    <>
      {user ? (
        <>
          <NavLink to={paths.bench} className={link}>
            Bench
          </NavLink>
          <NavLink to={paths.rack} className={link}>
            Rack
          </NavLink>
        </>
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
