import { useDeferredValue, useMemo, useState } from 'react';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { stockNeeded, type StockNeed } from '#shared/core/stock-needed.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import type { Trial } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';

/** What a trial is cut from: sheet, sticks and blocks by material and size. */
export function StockSection({ name, plan, trial }: { name: string; plan: Plan; trial: Trial }) {
  const units = useUnits();
  // Measured only where it is looked at, and never in the way of a choice.
  const [open, setOpen] = useState(false);
  const later = useDeferredValue(trial);
  const tried = useMemo(() => (open ? withWood(plan, later.materials) : null), [open, plan, later]);
  const needs = useMemo(() => (tried ? stockNeeded(tried) : []), [tried]);
  return (
    <details className="mt-4" open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="opens min-h-row font-semibold">Stock that “{name}” takes</summary>
      <p className="max-w-prose text-note text-graphite">
        Net, as the finished parts measure: offcuts and the saw come on top. No prices are known here.
      </p>
      <Table caption={`Stock that ${name} takes`} className="mt-1 max-w-4xl">
        <thead>
          <tr>
            <Th>Material</Th>
            <Th>Size</Th>
            <Th numeric>Pieces</Th>
            <Th numeric>Needed</Th>
            <Th numeric>Mass</Th>
          </tr>
        </thead>
        <tbody>
          {needs.map((need, i) => (
            <Tr key={i}>
              <RowTh>{tried?.materials[need.material]?.name ?? need.material}</RowTh>
              <Td>{sizeText(need, units)}</Td>
              <Td numeric>{units.format(need.pieces, 'count')}</Td>
              <Td numeric>{amountText(need, units)}</Td>
              <Td numeric>{units.format(need.mass, 'mass')}</Td>
            </Tr>
          ))}
        </tbody>
      </Table>
    </details>
  );
}

function sizeText(need: StockNeed, units: Units): string {
  switch (need.form) {
    case 'sheet':
      return `Sheet ${units.size(need.thickness)}`;
    case 'stick':
      return `Stick ${units.size(need.height, { bare: true })} × ${units.size(need.width)}`;
    case 'block':
      return 'Block';
  }
}

function amountText({ area, length, volume }: StockNeed, units: Units): string {
  if (area !== null) return units.format(area, 'area');
  if (length !== null) return units.format(length, 'length');
  return units.format(volume, 'volume');
}
