import { useRef } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Table, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Surface } from '#shared/core/plan.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import { changePanel, changeSurface, nextPanel, type PanelNumber } from '../edits/plan-edits.ts';
import type { Desk } from './rows-pane.tsx';

const COLUMNS: readonly { field: PanelNumber; head: string; label: string; quantity: Quantity }[] = [
  { field: 'span', head: 'Span', label: 'span', quantity: 'length' },
  { field: 'rootChord', head: 'Root', label: 'root chord', quantity: 'length' },
  { field: 'tipChord', head: 'Tip', label: 'tip chord', quantity: 'length' },
  { field: 'sweep', head: 'Sweep', label: 'sweep of the leading edge', quantity: 'length' },
  { field: 'dihedral', head: 'Dih. °', label: 'dihedral', quantity: 'angle' },
];

interface PanelsTableProps {
  desk: Desk;
  surface: Surface;
  index: number;
}

/** Panels from root to tip, each number in its cell. */
export function PanelsTable({ desk, surface, index }: PanelsTableProps) {
  const { panels } = surface;
  const units = useUnits();
  const set = (i: number, field: PanelNumber, value: number) =>
    desk.edit(
      changeSurface(index, (s) => ({ ...s, panels: changePanel(s.panels, i, { [field]: value }) })),
      `${surface.key}: panel ${i + 1} ${field}`,
    );
  const add = () =>
    desk.edit(
      changeSurface(index, (s) => {
        const last = s.panels.at(-1);
        return last ? { ...s, panels: [...s.panels, nextPanel(last)] } : s;
      }),
      `${surface.key}: add a panel`,
    );
  const addButton = useRef<HTMLButtonElement>(null);
  const remove = (i: number) => {
    // The pressed button goes with its panel.
    addButton.current?.focus();
    desk.edit(
      changeSurface(index, (s) => ({ ...s, panels: s.panels.filter((_, at) => at !== i) })),
      `${surface.key}: remove panel ${i + 1}`,
    );
  };
  return (
    <>
      <div className="flex items-center justify-between">
        <h2 className="caption px-2">Panels, root to tip · {units.label('length')}</h2>
        {desk.canEdit && (
          <Button ref={addButton} variant="plain" className="text-note" onClick={add}>
            Add a panel
          </Button>
        )}
      </div>
      <Table caption={`Panels of the ${surface.key}, root to tip`} className="table-fixed">
        <thead>
          <tr>
            <Th className="w-6">
              <span className="sr-only">Panel</span>
            </Th>
            {COLUMNS.map(({ field, head }) => (
              <Th key={field} numeric className="px-1">
                {head}
              </Th>
            ))}
            {panels.length > 1 && desk.canEdit && (
              <Th className="w-7">
                <span className="sr-only">Remove</span>
              </Th>
            )}
          </tr>
        </thead>
        <tbody>
          {panels.map((panel, i) => (
            // Panels have no name of their own; their place is what they are known by.
            <Tr key={i}>
              <th
                scope="row"
                className="h-row px-1 pt-2 text-left align-top text-note font-normal text-graphite"
              >
                {i + 1}
              </th>
              {COLUMNS.map(({ field, label, quantity }) => (
                <td key={field} className="h-row px-0.5 py-0.5 align-top">
                  <NumberField
                    compact
                    className="min-w-0!"
                    label={`Panel ${i + 1}, ${label}`}
                    quantity={quantity}
                    value={panel[field]}
                    error={desk.issues.get(`surfaces/${index}/panels/${i}/${field}`)}
                    readOnly={!desk.canEdit}
                    onChange={(value) => value !== null && set(i, field, value)}
                  />
                </td>
              ))}
              {panels.length > 1 && desk.canEdit && (
                <td className="h-row text-right align-top">
                  <button
                    type="button"
                    aria-label={`Remove panel ${i + 1}`}
                    title={`Remove panel ${i + 1}`}
                    onClick={() => remove(i)}
                    className="grid min-h-row w-full place-items-center rounded-md text-ink hover:bg-ink-wash"
                  >
                    ×
                  </button>
                </td>
              )}
            </Tr>
          ))}
        </tbody>
      </Table>
    </>
  );
}
