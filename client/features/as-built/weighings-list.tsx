import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import type { WeighingInput } from '#shared/schemas/weighing.ts';
import type { Noted } from '#client/lib/built/account.ts';
import { CorrectDialog } from './correct-dialog.tsx';
import type { Built } from '#client/lib/built/use-built.ts';

interface WeighingsListProps {
  built: Built;
  canWeigh: boolean;
  gliderVersion: number;
}

/** Everything that was written down, the newest first; what was corrected stays to be read. */
export function WeighingsList({ built, canWeigh, gliderVersion }: WeighingsListProps) {
  const units = useUnits();
  const [correcting, setCorrecting] = useState<Noted | null>(null);
  const { noted } = built;
  if (noted.length === 0) return null;
  return (
    <section aria-label="Weighings" className="mt-10 border-t border-rule pt-6">
      <h2 className="text-heading font-semibold">Written down</h2>
      <Table caption="Weighings" className="mt-2 max-w-4xl">
        <thead>
          <tr>
            <Th>No.</Th>
            <Th>On the scale</Th>
            <Th numeric>Mass {units.label('mass')}</Th>
            <Th className="max-sm:hidden">By</Th>
            <Th>
              <span className="sr-only">Correct</span>
            </Th>
          </tr>
        </thead>
        <tbody>
          {noted.toReversed().map((one) => (
            <Tr key={one.id}>
              <Td>{one.number ?? '–'}</Td>
              <RowTh className="py-1">
                <span className={one.correctedBy === null ? undefined : 'line-through'}>
                  {one.input.title}
                </span>
                <span className="block text-note text-graphite">{stateWords(one, noted)}</span>
                {one.refused !== null && (
                  <span className="block text-note text-red">
                    <span aria-hidden="true">▲ </span>Not taken: {one.refused}
                  </span>
                )}
              </RowTh>
              <Td numeric>
                {one.mass === null
                  ? 'taken back'
                  : `${units.format(one.mass, 'mass', { bare: true })} ± ${units.doubt(one.u, 'mass', { bare: true })}`}
              </Td>
              <Td className="text-note text-graphite max-sm:hidden">
                {one.by === null ? 'on this device' : `${one.by}, ${formatMoment(one.input.weighedAt)}`}
              </Td>
              <Td className="text-right">
                {canWeigh && one.number === null && (
                  <Button variant="plain" onClick={() => built.drop(one.id)}>
                    Take back
                  </Button>
                )}
                {canWeigh && one.number !== null && one.correctedBy === null && !one.input.withdraws && (
                  <Button variant="plain" onClick={() => setCorrecting(one)}>
                    Correct<span className="sr-only"> {one.input.title}</span>
                  </Button>
                )}
              </Td>
            </Tr>
          ))}
        </tbody>
      </Table>
      {correcting && (
        <CorrectDialog
          noted={correcting}
          onClose={() => setCorrecting(null)}
          onNote={(changes: Partial<WeighingInput>) => {
            built.note({ ...correcting.input, ...changes, gliderVersion, corrects: correcting.id });
            setCorrecting(null);
          }}
        />
      )}
    </section>
  );
}

function stateWords({ id, input, correctedBy, number }: Noted, noted: readonly Noted[]): string {
  const later = noted.find((one) => one.id === correctedBy);
  const earlier = noted.find((one) => one.id === input.corrects);
  return [
    ...(number === null ? ['waits to be sent'] : []),
    ...(later ? [`corrected by ${later.number === null ? 'one that waits' : `No. ${later.number}`}`] : []),
    ...(earlier
      ? [`${input.withdraws ? 'takes back' : 'corrects'} No. ${earlier.number ?? ''}: ${input.reason}`]
      : []),
    ...(input.values.length > 1 && id !== '' ? [`mean of ${input.values.length} readings`] : []),
    ...(input.note === '' ? [] : [input.note]),
  ].join('; ');
}
