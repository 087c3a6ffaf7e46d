import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { areaRows } from './areas.ts';

/** Area and loading by each definition. */
export function AreaTable({ plan, result }: { plan: Plan; result: Estimate }) {
  const units = useUnits();
  const other = units.other('loading') ?? 'oz/ft2';
  return (
    <section aria-label="Area and loading">
      <h2 className="caption">Area and loading</h2>
      <Table caption="Area and loading by definition">
        <thead>
          <tr>
            <Th>Area</Th>
            <Th numeric>{units.label('area')}</Th>
            <Th numeric>{units.label('loading')}</Th>
            <Th numeric>{units.label('loading', { unit: other })}</Th>
          </tr>
        </thead>
        <tbody>
          {areaRows(plan, result).map(({ key, name, note, area, loading }) => (
            <tr key={key}>
              <RowTh className="py-1.5">
                <span className={key === 'projected' ? 'font-semibold' : undefined}>{name}</span>
                <span className="block text-note text-graphite">{note}</span>
              </RowTh>
              <Td numeric>
                <AskWhy question={{ of: 'area', kind: key }}>
                  {units.format(area, 'area', { bare: true })}
                </AskWhy>
              </Td>
              <Td numeric className="font-semibold">
                <AskWhy question={{ of: 'loading', kind: key }}>
                  {units.format(loading, 'loading', { bare: true, fine: true })}
                </AskWhy>
              </Td>
              <Td numeric>
                <AskWhy question={{ of: 'loading', kind: key }} second>
                  {units.format(loading, 'loading', { unit: other, bare: true, fine: true })}
                </AskWhy>
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
