import { useUnits } from '#client/lib/units.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import { FIGURES } from './columns.tsx';
import { MaterialMenu, type MaterialActions } from './material-menu.tsx';
import { MaterialNotes, UsedBy } from './materials-table.tsx';
import { Swatch } from './swatch.tsx';

/** The same rows for a narrow screen: name and known figures, the rest one press away. */
export function MaterialCards({
  materials,
  ...actions
}: MaterialActions & { materials: readonly MaterialDto[] }) {
  const units = useUnits();
  return (
    <ul className="border-t border-strong-rule">
      {materials.map((row) => (
        <li key={row.id} className="border-b border-rule py-2.5">
          <div className="flex items-center gap-3">
            <Swatch material={row} />
            <h2 className="min-w-0 flex-1 font-semibold">
              {row.name}
              {!row.shared && <span className="ml-1.5 text-note font-normal text-graphite">your own</span>}
            </h2>
            <MaterialMenu row={row} {...actions} />
          </div>
          <dl className="mt-1 flex flex-wrap gap-x-4 gap-y-1 items-baseline text-note">
            {FIGURES.map(({ id, label, quantity }) => {
              const value = row[id];
              return value === null ? null : (
                <div key={id} className="flex gap-1.5">
                  <dt className="text-graphite">{label}</dt>
                  <dd>{units.format(value, quantity)}</dd>
                </div>
              );
            })}
            <div className="flex items-baseline gap-1.5">
              <dt className="text-graphite">Used by</dt>
              <dd>
                <UsedBy row={row} {...actions} />
              </dd>
            </div>
          </dl>
          <details>
            <summary className="opens text-note">{capital(row.basis)}</summary>
            <MaterialNotes row={row} />
          </details>
        </li>
      ))}
    </ul>
  );
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
