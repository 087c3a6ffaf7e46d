import { Menu, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';

export interface SaveActions {
  onCompare: (from: number, to: number | 'now') => void;
  /** absent for who may not edit */
  onBringBack?: ((save: GliderSaveDto) => void) | undefined;
  /** absent for who may not name states */
  onName?: ((save: GliderSaveDto) => void) | undefined;
}

interface SaveMenuProps extends SaveActions {
  save: GliderSaveDto;
  /** the state that lies on the desk */
  newest: boolean;
  /** oldest of the saves that the row tells of */
  first: GliderSaveDto;
}

/** What can be done with a saved state. */
export function SaveMenu({ save, newest, first, onCompare, onBringBack, onName }: SaveMenuProps) {
  const before = first.changes === null ? null : first.version - 1;
  return (
    <Menu
      trigger={
        <button
          type="button"
          aria-label={`Actions for the state of ${formatMoment(save.savedAt)}`}
          className="grid size-row place-items-center rounded-md text-graphite hover:bg-ink-wash hover:text-ink"
        >
          <svg viewBox="0 0 16 4" width="16" height="4" aria-hidden="true" fill="currentColor">
            <circle cx="2" cy="2" r="1.6" />
            <circle cx="8" cy="2" r="1.6" />
            <circle cx="14" cy="2" r="1.6" />
          </svg>
        </button>
      }
    >
      {before !== null && (
        <MenuItem onSelect={() => onCompare(before, save.version)}>Compare with the state before</MenuItem>
      )}
      {(!newest || before === null) && (
        <MenuItem onSelect={() => onCompare(save.version, 'now')}>Compare with now</MenuItem>
      )}
      {onName && (
        <>
          <MenuLine />
          <MenuItem onSelect={() => onName(save)}>{save.name === null ? 'Name …' : 'Rename …'}</MenuItem>
        </>
      )}
      {onBringBack && !newest && <MenuItem onSelect={() => onBringBack(save)}>Bring back</MenuItem>}
    </Menu>
  );
}
