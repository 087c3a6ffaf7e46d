import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import type { SpeedAt } from './speeds.ts';

interface SpeedTableProps {
  rows: readonly (SpeedAt & { name: string; lift: number })[];
}

/** Speeds in the units that people fly by, and the Reynolds number of each. */
export function SpeedTable({ rows }: SpeedTableProps) {
  return (
    <section aria-label="Speeds">
      <Table caption="Speeds in this air">
        <thead>
          <tr>
            <Th>Speed</Th>
            <Th numeric>at lift coeff.</Th>
            <Th numeric>m/s</Th>
            <Th numeric>km/h</Th>
            <Th numeric>ft/s</Th>
            <Th numeric>Reynolds, MAC</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name, lift, speed, reynolds }) => (
            <tr key={name}>
              <RowTh className="font-semibold">{name}</RowTh>
              <Td numeric>{formatNumber(lift, 2)}</Td>
              <Td numeric className="font-semibold">
                {formatQuantity(speed, 'speed', { bare: true })}
              </Td>
              <Td numeric>{formatQuantity(speed, 'speed', { unit: 'km/h', bare: true })}</Td>
              <Td numeric>{formatQuantity(speed, 'speed', { unit: 'ft/s', bare: true })}</Td>
              <Td numeric>{formatQuantity(reynolds, 'reynolds')}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
