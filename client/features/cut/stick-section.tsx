import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { StickFigure } from './stick-figure.tsx';
import { stickRows, type StickGroup } from './stick-groups.ts';
import { spliceWords, stickName } from './words.ts';

interface StickSectionProps {
  plan: Plan;
  group: StickGroup;
  longest: number;
}

/** The sticks of one size: from what they are cut, and each with its true length. */
export function StickSection({ plan, group, longest }: StickSectionProps) {
  const units = useUnits();
  const { material, width, thickness, needs, packing } = group;
  const wood = plan.materials[material];
  const size = `${units.size(width, { bare: true })} × ${units.size(thickness)}`;
  const rows = stickRows(needs);
  const numbers = new Map(
    rows.flatMap(({ ids }, i) =>
      ids.flatMap((id) => [
        [id, i + 1] as const,
        ...[1, 2, 3, 4, 5, 6].map((part) => [`${id}, part ${part}`, i + 1] as const),
      ]),
    ),
  );
  const spare = packing.bought - packing.bound;
  return (
    <section aria-label={`${wood?.name ?? material}, ${size}`} className="mt-8 break-inside-avoid">
      <h2 className="text-heading font-semibold">
        {wood?.name ?? material}, {size}
      </h2>
      <p className="text-note text-graphite">
        {packing.bought === 0 ? 'All from what is at hand' : `${packing.bought} to buy`}
        {spare > 0 && `, at best ${packing.bound}`}.
      </p>
      <div className="mt-2 grid grid-cols-1 items-start gap-x-10 gap-y-4 lg:grid-cols-2 print:grid-cols-2">
        <div className="grid gap-y-2">
          {packing.sticks.map((stick, i) => (
            <div key={i}>
              <StickFigure stick={stick} longest={longest} material={wood} numbers={numbers} />
              <p className="text-note text-graphite">
                {stick.stock ?? 'New'}, {units.size(stick.length)}
                {stick.offcut > 0 && `; ${units.format(stick.offcut, 'length')} left to keep`}
              </p>
            </div>
          ))}
        </div>
        <Table caption={`Sticks of ${size}`}>
          <thead>
            <tr>
              <Th className="w-8">
                <span className="sr-only">Number</span>
              </Th>
              <Th>Stick</Th>
              <Th numeric>Pieces</Th>
              <Th numeric>True length {units.label('length')}</Th>
              <Th className="hidden w-8 print:table-cell">cut</Th>
            </tr>
          </thead>
          <tbody>
            {rows.map(({ ids, piece, splice, isOfBoth }, i) => {
              const joint = spliceWords(plan, piece, splice, units);
              return (
                <Tr key={piece.id}>
                  <Td className="font-semibold">{i + 1}</Td>
                  <RowTh className="py-1">
                    {stickName(isOfBoth ? { ...piece, side: 'middle' } : piece)}
                    {joint && (
                      <span
                        className={
                          'refused' in splice ? 'block text-note text-red' : 'block text-note text-graphite'
                        }
                      >
                        {'refused' in splice && <span aria-hidden="true">▲ </span>}
                        {joint}
                      </span>
                    )}
                  </RowTh>
                  <Td numeric>{ids.length}</Td>
                  <Td numeric>{units.format(piece.length, 'length', { bare: true })}</Td>
                  <Td className="hidden print:table-cell">☐</Td>
                </Tr>
              );
            })}
          </tbody>
        </Table>
      </div>
    </section>
  );
}
