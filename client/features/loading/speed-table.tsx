import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Air } from '#shared/core/atmosphere.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Unit } from '#shared/units/units.ts';
import type { SpeedAt } from './speeds.ts';

interface SpeedTableProps {
  air: Pick<Air, 'density' | 'viscosity'>;
  rows: readonly (SpeedAt & { name: string; lift: number })[];
}

/** Units of speed told beside the reader's own. */
const FLOWN_BY: readonly Unit[] = ['m/s', 'km/h', 'ft/s'];

/** Speeds in the units that people fly by, and the Reynolds number of each. */
export function SpeedTable({ rows, air: { density, viscosity } }: SpeedTableProps) {
  const units = useUnits();
  const own = units.unit('speed');
  const others = FLOWN_BY.filter((unit) => unit !== own).slice(0, 2);
  return (
    <section aria-label="Speeds">
      <Table caption="Speeds in this air">
        <thead>
          <tr>
            <Th>Speed</Th>
            <Th numeric>at lift coeff.</Th>
            {[own, ...others].map((unit) => (
              <Th key={unit} numeric>
                {units.label('speed', { unit })}
              </Th>
            ))}
            <Th numeric>Reynolds, MAC</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name, lift, speed, reynolds }) => (
            <tr key={name}>
              <RowTh className="font-semibold">{name}</RowTh>
              <Td numeric>{formatNumber(lift, 2)}</Td>
              <Td numeric className="font-semibold">
                <AskWhy question={{ of: 'speed', lift, density }}>
                  {units.format(speed, 'speed', { bare: true })}
                </AskWhy>
              </Td>
              {others.map((unit) => (
                <Td key={unit} numeric>
                  <AskWhy question={{ of: 'speed', lift, density }} second>
                    {units.format(speed, 'speed', { unit, bare: true })}
                  </AskWhy>
                </Td>
              ))}
              <Td numeric>
                <AskWhy question={{ of: 'reynolds', lift, density, viscosity }}>
                  {units.format(reynolds, 'reynolds')}
                </AskWhy>
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
