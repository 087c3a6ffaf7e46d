import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { FieldFigures } from '#shared/core/field/field-account.ts';
import { thresholdStanding, type MassThreshold } from '#shared/core/field/mass-threshold.ts';
import file from '#data/mass-thresholds.json' with { type: 'json' };

const STANDS = { below: 'below it', reached: 'reached', too_close: 'too close to tell' } as const;
const isUnit = (unit: string): unit is MassThreshold['unit'] => ['g', 'kg', 'oz', 'lb'].includes(unit);
const isBoundary = (text: string): text is MassThreshold['boundary'] => text === 'over' || text === 'from';

/** From what mass countries ask for more, as far as we have read it; the current rule counts. */
export function Thresholds({ flown }: { flown: FieldFigures | null }) {
  const units = useUnits();
  return (
    <details className="mt-2">
      <summary className="opens flex min-h-11 items-center text-note font-semibold">
        Masses from which countries ask for more
      </summary>
      <p className="text-note text-graphite">
        {flown
          ? `Held against ${units.format(flown.mass, 'mass')} as flown.`
          : 'Weigh the model, and it is held against them.'}{' '}
        Put together {file.checked}; look the rule up before you fly, it may have changed.
      </p>
      <Table caption="Mass thresholds" className="mt-1">
        <thead>
          <tr>
            <Th>Where</Th>
            <Th>What it asks</Th>
          </tr>
        </thead>
        <tbody>
          {file.thresholds.map(({ place, value, unit, boundary, says, counts, asOf, sure, source }) => (
            <Tr key={`${place} ${value} ${says}`}>
              <RowTh className="align-top whitespace-normal">
                {place}
                <span className="block font-normal">
                  {boundary} {value} {unit}
                </span>
                {flown && isUnit(unit) && isBoundary(boundary) && (
                  <span className="block text-note font-normal">
                    {STANDS[thresholdStanding({ value, unit, boundary }, flown)]}
                  </span>
                )}
              </RowTh>
              <Td className="py-1 whitespace-normal">
                {says}
                <span className="block text-note text-graphite">
                  Counted: {counts}. {asOf}, {sure}. {source}.
                </span>
              </Td>
            </Tr>
          ))}
        </tbody>
      </Table>
    </details>
  );
}
