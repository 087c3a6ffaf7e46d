import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Summary } from '#shared/core/draws-summary.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { Figures } from './tasks.ts';
import { quantile, TOLD } from './words.ts';

/** Mass and balance as reckoned, and what one draw in twenty lies below and above. */
export function DrawsTable({ figures }: { figures: Figures }) {
  const { nominal, mass, x, percentMac } = figures;
  const units = useUnits();
  const rows: { label: string; quantity: Quantity; reckoned: number | null; drawn: Summary | null }[] = [
    { label: `All-up mass ${units.label('mass')}`, quantity: 'mass', reckoned: nominal.mass, drawn: mass },
    { label: `Balance ${units.label('length')}`, quantity: 'length', reckoned: nominal.x, drawn: x },
    { label: 'Balance % MAC', quantity: 'percentMac', reckoned: nominal.percentMac, drawn: percentMac },
  ];
  return (
    <Table caption="Mass and balance as drawn" className="max-w-3xl">
      <thead>
        <tr>
          <Th>Quantity</Th>
          <Th numeric>As reckoned</Th>
          {TOLD.map((share) => (
            <Th key={share} numeric>
              {100 * share}
              {'\u202f'}% lie below
            </Th>
          ))}
          <Th numeric>±</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ label, quantity, reckoned, drawn }) => (
          <Tr key={label}>
            <RowTh>{label}</RowTh>
            <Td numeric>{units.format(reckoned, quantity, { bare: true })}</Td>
            {TOLD.map((share) => (
              <Td key={share} numeric className={share === 0.5 ? undefined : 'font-semibold'}>
                {units.format(drawn && quantile(drawn, share), quantity, { bare: true })}
              </Td>
            ))}
            <Td numeric>{units.doubt(drawn?.u, quantity, { bare: true })}</Td>
          </Tr>
        ))}
      </tbody>
    </Table>
  );
}
