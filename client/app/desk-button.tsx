import { useState, type ComponentProps, type ComponentType } from 'react';
import { useToast } from '#client/components/ui/toast.tsx';
import { cn } from '#client/lib/cn.ts';
import type { UserDto } from '#shared/schemas/session.ts';

interface DeskButtonProps extends ComponentProps<'button'> {
  user: UserDto | null | undefined;
}

/** What the desk's menu opens from. */
export function DeskButton({ user, className, ...rest }: DeskButtonProps) {
  return (
    <button
      type="button"
      className={cn(
        'inline-flex min-h-row max-w-40 items-center gap-1.5 rounded-md border border-rule bg-sheet px-2 text-graphite hover:text-ink',
        className,
      )}
      {...rest}
    >
      <span className="truncate">{user ? user.name : 'Menu'}</span>
      <svg viewBox="0 0 10 6" width="10" height="6" aria-hidden="true">
        <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.4" />
      </svg>
    </button>
  );
}

type DeskMenu = ComponentType<{ user: UserDto | null | undefined }>;
const fetchMenu = async (): Promise<DeskMenu> => (await import('./desk-menu.tsx')).DeskMenu;

/** The menu is fetched when somebody reaches for it; no page has to wait for it. */
export function DeskMenuWhenWanted({ user }: { user: UserDto | null | undefined }) {
  const [Opened, setOpened] = useState<DeskMenu | null>(null);
  const say = useToast();
  if (Opened) return <Opened user={user} />;
  const open = () => {
    fetchMenu().then(
      (menu) => setOpened(() => menu),
      () => say('The menu could not be fetched. Look at the connection and try again.'),
    );
  };
  // Fetched ahead; what fails here is told when the button is pressed.
  const prepare = () => void fetchMenu().catch(() => undefined);
  return (
    <DeskButton
      user={user}
      aria-haspopup="menu"
      aria-expanded={false}
      onPointerEnter={prepare}
      onFocus={prepare}
      onClick={open}
      onKeyDown={(event) => {
        if (event.key !== 'ArrowDown') return;
        event.preventDefault();
        open();
      }}
    />
  );
}
