import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { SheetFigure } from './sheet-figure.tsx';
import type { SheetGroup } from './sheet-groups.ts';
import { grainWords, packedWords } from './words.ts';

interface SheetSectionProps {
  plan: Plan;
  group: SheetGroup;
  longest: number;
}

/** The blanks of one sheet: how they lie on it, and each with its size. */
export function SheetSection({ plan, group, longest }: SheetSectionProps) {
  const units = useUnits();
  const { material, thickness, blanks, packing } = group;
  const wood = plan.materials[material];
  const title = `${wood?.name ?? material}, ${units.size(thickness)} sheet`;
  const numbered = new Map(
    blanks.flatMap(({ ids, length, width }, i) =>
      ids.map((id) => [id, { length, width, number: i + 1 }] as const),
    ),
  );
  const size = (mm: number) => units.format(mm, 'length', { bare: true });
  return (
    <section aria-label={title} className="mt-8 break-inside-avoid">
      <h2 className="text-heading font-semibold">{title}</h2>
      <p className="text-note text-graphite">
        {packedWords(packing)} {grainWords(blanks)}
      </p>
      {packing.tooLarge.length > 0 && (
        <p className="text-note text-red">
          <span aria-hidden="true">▲ </span>
          {packing.tooLarge.length} {packing.tooLarge.length === 1 ? 'blank is' : 'blanks are'} larger than
          any sheet: join sheets for {packing.tooLarge.length === 1 ? 'it' : 'them'}.
        </p>
      )}
      <div className="mt-2 grid grid-cols-1 items-start gap-x-10 gap-y-4 lg:grid-cols-2 print:grid-cols-2">
        <div className="grid gap-y-2">
          {packing.sheets.map((sheet, i) => {
            const name = sheet.stock ?? 'New';
            const of = `${units.size(sheet.length, { bare: true })} × ${units.size(sheet.width)}`;
            const label = `${name} sheet, ${of}, with ${sheet.laid.length} blanks`;
            return (
              <div key={i}>
                <SheetFigure
                  {...{ label, sheet, longest }}
                  laid={sheet.laid}
                  blanks={numbered}
                  material={wood}
                />
                <p className="text-note text-graphite">
                  {name}, {of}; {units.format(sheet.used, 'share')} of it used
                </p>
              </div>
            );
          })}
        </div>
        <Table caption={`Blanks of ${title}`}>
          <thead>
            <tr>
              <Th className="w-8">
                <span className="sr-only">Number</span>
              </Th>
              <Th>Blank</Th>
              <Th numeric>Pieces</Th>
              <Th numeric>Along grain {units.label('length')}</Th>
              <Th numeric>Across {units.label('length')}</Th>
              <Th className="hidden w-8 print:table-cell">cut</Th>
            </tr>
          </thead>
          <tbody>
            {blanks.map(({ name, number, ids, length, width }, i) => (
              <Tr key={ids[0]}>
                <Td className="font-semibold">{i + 1}</Td>
                <RowTh>
                  {name}
                  {number !== null && `, ${number}`}
                </RowTh>
                <Td numeric>{ids.length}</Td>
                <Td numeric>{size(length)}</Td>
                <Td numeric>{size(width)}</Td>
                <Td className="hidden print:table-cell">☐</Td>
              </Tr>
            ))}
          </tbody>
        </Table>
      </div>
    </section>
  );
}
