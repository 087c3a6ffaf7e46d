import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { SaveStatus } from './save-status.tsx';
import { CellText, cellsOf } from './title-cells.tsx';
import { PhoneBar } from './phone-bar.tsx';

/** The one constant of every page of a glider: what is always wanted, at the lower right of the sheet. */
export function TitleBlock({ workspace }: { workspace: Workspace }) {
  const cells = cellsOf(workspace, useUnits());
  return (
    <>
      <section
        aria-label="Title block"
        className="sticky bottom-0 z-10 mt-auto ml-auto hidden max-w-full border-t border-l border-strong-rule bg-sheet sm:flex print:static print:flex"
      >
        {cells.map((cell) => (
          <div key={cell.label} className="border-r border-rule px-3.5 py-2">
            <CellText {...cell} />
          </div>
        ))}
        <div className="flex flex-col justify-between px-3.5 py-2 text-note">
          <span className="text-label text-graphite">Glider</span>
          <strong className="max-w-48 truncate text-body font-semibold">{workspace.plan.name}</strong>
          <SaveStatus workspace={workspace} />
        </div>
      </section>
      <PhoneBar workspace={workspace} cells={cells} />
    </>
  );
}
