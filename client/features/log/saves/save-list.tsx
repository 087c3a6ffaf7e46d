import { useId, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import type { SaveGroup } from './save-groups.ts';
import type { SaveActions } from './save-menu.tsx';
import { SaveRow } from './save-row.tsx';

interface SaveListProps {
  groups: readonly SaveGroup[];
  materials: Plan['materials'];
  actions: SaveActions;
  /** earlier states are on the server */
  hasMore: boolean;
  onMore: () => void;
  pending: boolean;
}

/** Every saved state, newest first. */
export function SaveList({ groups, materials, actions, hasMore, onMore, pending }: SaveListProps) {
  const saves = groups.flatMap((group) => group.saves);
  const moments = new Map(saves.map(({ version, savedAt }) => [version, formatMoment(savedAt)]));
  const shared = {
    materials,
    actions,
    momentOf: (version: number) => moments.get(version) ?? null,
    newestVersion: saves[0]?.version ?? 0,
  };
  return (
    <section aria-label="Saved states">
      <h2 className="caption">Saved states</h2>
      <ol className="mt-1 border-t border-strong-rule">
        {groups.map((group) => (
          <li key={group.saves[0].version}>
            <Group group={group} {...shared} />
          </li>
        ))}
      </ol>
      {hasMore && (
        <Button className="mt-3" onClick={onMore} pending={pending} pendingText="Fetching …">
          Show earlier states
        </Button>
      )}
    </section>
  );
}

interface GroupProps {
  group: SaveGroup;
  materials: Plan['materials'];
  actions: SaveActions;
  momentOf: (version: number) => string | null;
  newestVersion: number;
}

function Group({ group: { saves, changes }, newestVersion, ...shared }: GroupProps) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const [newest] = saves;
  const first = saves.at(-1) ?? newest;
  const several = saves.length > 1;
  return (
    <>
      <SaveRow
        save={newest}
        first={first}
        changes={changes}
        newest={newest.version === newestVersion}
        {...shared}
        opener={
          several && (
            <button
              type="button"
              aria-expanded={open}
              aria-controls={open ? id : undefined}
              onClick={() => setOpen(!open)}
              className="-ml-1 flex min-h-6 items-center gap-1 rounded-sm px-1 text-note text-ink hover:bg-ink-wash pointer-coarse:min-h-11"
            >
              <Triangle open={open} />
              {saves.length} saves
            </button>
          )
        }
      />
      {open && (
        <ol id={id} className="border-l-3 border-l-ink-wash pl-3">
          {saves.map((save: GliderSaveDto) => (
            <li key={save.version}>
              <SaveRow
                save={save}
                first={save}
                changes={save.changes}
                newest={save.version === newestVersion}
                {...shared}
              />
            </li>
          ))}
        </ol>
      )}
    </>
  );
}

function Triangle({ open }: { open: boolean }) {
  return (
    <svg
      viewBox="0 0 10 10"
      width="9"
      height="9"
      aria-hidden="true"
      className={open ? 'rotate-90' : undefined}
    >
      <path d="M1.5 0.5 9 5 1.5 9.5z" fill="currentColor" />
    </svg>
  );
}
