import { useId, useState } from 'react';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { SaveStatus } from './save-status.tsx';
import { CellText, type Cell } from './title-cells.tsx';
import { UndoButtons } from './undo-buttons.tsx';
import { balanceVerdict } from './verdict.ts';

/** The title block on the phone: a bar at the bottom that opens upward. */
export function PhoneBar({ workspace, cells }: { workspace: Workspace; cells: Cell[] }) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const [mass, balance] = cells;
  return (
    <section
      aria-label="Title block"
      className="sticky bottom-0 z-10 mt-auto border-t border-strong-rule bg-sheet pb-[env(safe-area-inset-bottom)] sm:hidden print:hidden"
    >
      {open && (
        <div id={id}>
          <div className="grid grid-cols-2">
            {cells.map((cell) => (
              <div key={cell.label} className="border-r border-b border-rule px-3.5 py-2 even:border-r-0">
                <CellText {...cell} />
              </div>
            ))}
          </div>
          <p className="border-b border-rule px-3.5 py-2 text-note">
            <SaveStatus workspace={workspace} />
          </p>
        </div>
      )}
      <div className="flex items-center">
        <button
          type="button"
          aria-expanded={open}
          aria-controls={open ? id : undefined}
          onClick={() => setOpen(!open)}
          className="flex min-h-12 min-w-0 flex-1 items-center gap-3 px-3.5 text-left"
        >
          <Chevron up={!open} />
          <strong className="font-semibold">{mass?.figure}</strong>
          <strong className="font-semibold">
            <VerdictMark workspace={workspace} />
            {balance?.figure}
          </strong>
        </button>
        {!open && <SaveStatus workspace={workspace} brief />}
        <UndoButtons workspace={workspace} className="pr-1" />
      </div>
    </section>
  );
}

function VerdictMark({ workspace: { plan, result } }: { workspace: Workspace }) {
  const units = useUnits();
  const verdict = balanceVerdict(plan, result, units);
  if (!verdict || verdict.kind === 'inside') return null;
  const out = verdict.kind === 'outside';
  return (
    <span className={cn('mr-1 text-note', out ? 'text-red' : 'text-ochre')}>
      <span aria-hidden="true">{out ? '▲' : '◆'}</span>
      <span className="sr-only">{verdict.text}: </span>
    </span>
  );
}

function Chevron({ up }: { up: boolean }) {
  return (
    <svg
      viewBox="0 0 10 6"
      width="12"
      height="8"
      aria-hidden="true"
      className={cn('shrink-0', up && 'rotate-180')}
    >
      <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.4" />
    </svg>
  );
}
