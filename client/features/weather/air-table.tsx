import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { overMinimum, type AirRow } from './airs.ts';

interface AirTableProps {
  rows: readonly AirRow[];
  /** as drawn */
  drawn: { mass: number; percentMac: number | null };
  /** least mass of the class, g; null where none is told */
  minimum: number | null;
}

/** Mass and balance in each air beside those that the plan reckons with. */
export function AirTable({ rows, drawn, minimum }: AirTableProps) {
  const units = useUnits();
  const mass = (value: number) => units.format(value, 'mass', { bare: true });
  const mac = (value: number | null) => units.format(value, 'percentMac', { bare: true });
  return (
    <Table caption="Mass and balance by the air">
      <thead>
        <tr>
          <Th>Air</Th>
          <Th numeric>Wood holds %</Th>
          <Th numeric>Mass {units.label('mass')}</Th>
          <Th numeric>Balance % MAC</Th>
          {minimum !== null && <Th numeric>Over the minimum</Th>}
        </tr>
      </thead>
      <tbody>
        <Tr>
          <RowTh className="py-1">
            As drawn
            <span className="block text-note text-graphite">as listed</span>
          </RowTh>
          <Td numeric />
          <Td numeric className="font-semibold">
            {mass(drawn.mass)}
          </Td>
          <Td numeric>{mac(drawn.percentMac)}</Td>
          {minimum !== null && <Over mass={drawn.mass} minimum={minimum} />}
        </Tr>
        {rows.map((row) => (
          <Tr key={row.key}>
            <RowTh className="py-1">
              {row.name}
              <span className="block text-note text-graphite">
                {formatNumber(row.air.temperature, 0)}
                {NARROW_SPACE}°C, {units.format(row.air.humidity, 'share')}
              </span>
            </RowTh>
            <Td numeric>{units.format(row.moisture, 'fineShare', { bare: true })}</Td>
            <Td numeric className="font-semibold">
              {mass(row.mass)}
            </Td>
            <Td numeric>{mac(row.percentMac)}</Td>
            {minimum !== null && <Over mass={row.mass} minimum={minimum} />}
          </Tr>
        ))}
      </tbody>
    </Table>
  );
}

function Over({ mass, minimum }: { mass: number; minimum: number }) {
  const units = useUnits();
  const { over, short } = overMinimum(mass, minimum);
  const text = units.format(Math.abs(over), 'mass');
  return (
    <Td numeric className={short ? 'text-red' : undefined}>
      {short ? (
        <>
          <span aria-hidden="true">▲{NARROW_SPACE}</span>
          {text} short
        </>
      ) : (
        `${text} over`
      )}
    </Td>
  );
}
