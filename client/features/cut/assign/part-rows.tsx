import { Select, type Option } from '#client/components/ui/select.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { grams } from '#shared/core/cut/assign-account.ts';
import type { CutPart } from '#shared/core/cut/cut-parts.ts';
import { misfit, nearestMiss } from '#shared/core/cut/stock-fit.ts';
import type { Assignment } from './use-assignment.ts';
import { faultWords, missWords, partName } from './words.ts';

interface PartRowsProps {
  assignment: Assignment;
  parts: readonly CutPart[];
  canEdit: boolean;
}

const NONE = '';

/** The pieces of one part, each with what it is cut from and what stands against it. */
export function PartRows({ assignment, parts, canEdit }: PartRowsProps) {
  const units = useUnits();
  const { problem, pieces, choice, fixed, account, place } = assignment;
  const densityOf = new Map(problem.stock.map(({ id, density }) => [id, density]));
  const numberOf = new Map(pieces.map(({ id, number }) => [id, number]));
  const optionsOf = (part: CutPart): Option[] => {
    const here = choice.get(part.id);
    const fitting = problem.stock.filter((piece) => piece.id === here || misfit(part, piece) === null);
    return [
      { value: NONE, label: 'to be bought' },
      ...fitting.map(({ id, density }) => ({
        value: id,
        label: `No. ${numberOf.get(id) ?? ''}, ${units.format(density, 'density')}`,
      })),
    ];
  };
  return (
    <Table caption={`Pieces of ${parts[0]?.name ?? ''}`} className="mb-3">
      <thead>
        <tr>
          <Th>Part</Th>
          <Th numeric className="max-sm:hidden">
            Size {units.label('length')}
          </Th>
          <Th>From</Th>
          <Th numeric>{units.label('mass')}</Th>
        </tr>
      </thead>
      <tbody>
        {parts.map((part) => {
          const here = choice.get(part.id) ?? null;
          const fault = faultWords(part.id, account.faults, units);
          const miss = here === null ? nearestMiss(part, problem.stock) : null;
          const name = partName(part);
          const size = [part.length, part.width].map((mm) => units.format(mm, 'length', { bare: true }));
          return (
            <Tr key={part.id}>
              <RowTh className="py-1">
                {name}
                {fault && (
                  <span className="block text-note text-red">
                    <span aria-hidden="true">▲ </span>
                    {fault}
                  </span>
                )}
                {miss && <span className="block text-note text-graphite">{missWords(miss, units)}</span>}
              </RowTh>
              <Td numeric className="max-sm:hidden">
                {size.join(' × ')}
              </Td>
              <Td>
                <Select
                  label={`Piece for ${name}`}
                  hideLabel
                  keepRoom={false}
                  disabled={!canEdit}
                  value={here ?? NONE}
                  options={optionsOf(part)}
                  onValue={(value) => place(part.id, value === NONE ? null : value)}
                />
                {fixed.has(part.id) && <span className="text-note text-graphite">by hand</span>}
              </Td>
              <Td numeric>
                {units.format(grams(part, densityOf.get(here ?? '') ?? part.density), 'mass', { bare: true })}
              </Td>
            </Tr>
          );
        })}
      </tbody>
    </Table>
  );
}
