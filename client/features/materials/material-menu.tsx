import { Menu, MenuItem } from '#client/components/ui/menu.tsx';
import type { MaterialDto } from '#shared/schemas/material.ts';

/** What can be done with a row; a visitor only reads. */
export interface MaterialActions {
  onEdit: (row: MaterialDto) => void;
  onDelete: (row: MaterialDto) => void;
  /** Begins a row of one's own with the same figures. */
  onCopy?: ((row: MaterialDto) => void) | undefined;
  onUses?: ((row: MaterialDto) => void) | undefined;
}

export function MaterialMenu({ row, onEdit, onDelete, onCopy }: MaterialActions & { row: MaterialDto }) {
  if (!onCopy && !row.can.edit && !row.can.delete) return null;
  return (
    <Menu
      trigger={
        <button
          type="button"
          aria-label={`Actions for ${row.name}`}
          className="inline-grid size-row place-items-center rounded-md text-graphite hover:bg-ink-wash hover:text-ink"
        >
          <svg viewBox="0 0 16 4" width="16" height="4" aria-hidden="true" fill="currentColor">
            <circle cx="2" cy="2" r="1.6" />
            <circle cx="8" cy="2" r="1.6" />
            <circle cx="14" cy="2" r="1.6" />
          </svg>
        </button>
      }
    >
      {row.can.edit && <MenuItem onSelect={() => onEdit(row)}>Edit …</MenuItem>}
      {onCopy && <MenuItem onSelect={() => onCopy(row)}>Copy as my own …</MenuItem>}
      {row.can.delete && (
        <MenuItem danger onSelect={() => onDelete(row)}>
          Delete …
        </MenuItem>
      )}
    </Menu>
  );
}
