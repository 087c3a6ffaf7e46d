import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { areaRows } from './areas.ts';

/** Area and loading by each definition. */
export function AreaTable({ plan, result }: { plan: Plan; result: Estimate }) {
  return (
    <section aria-label="Area and loading">
      <h2 className="caption">Area and loading</h2>
      <Table caption="Area and loading by definition">
        <thead>
          <tr>
            <Th>Area</Th>
            <Th numeric>dm²</Th>
            <Th numeric>g/dm²</Th>
            <Th numeric>oz/ft²</Th>
          </tr>
        </thead>
        <tbody>
          {areaRows(plan, result).map(({ key, name, note, area, loading }) => (
            <tr key={key}>
              <RowTh className="py-1.5">
                <span className={key === 'projected' ? 'font-semibold' : undefined}>{name}</span>
                <span className="block text-note text-graphite">{note}</span>
              </RowTh>
              <Td numeric>{formatQuantity(area, 'area', { bare: true })}</Td>
              <Td numeric className="font-semibold">
                {formatQuantity(loading, 'loading', { bare: true, fine: true })}
              </Td>
              <Td numeric>
                {formatQuantity(loading, 'loading', { unit: 'oz/ft2', bare: true, fine: true })}
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
