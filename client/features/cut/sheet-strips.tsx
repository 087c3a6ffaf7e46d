import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { StickPiece } from '#shared/core/cut/cut-list.ts';
import type { Plan } from '#shared/core/plan.ts';
import { stickName } from './words.ts';

/** Strips too wide to be sold as sticks: cut from sheet of their thickness, grain along them. */
export function SheetStrips({ plan, strips }: { plan: Plan; strips: readonly StickPiece[] }) {
  const units = useUnits();
  const size = (mm: number) => units.format(mm, 'length', { bare: true });
  if (strips.length === 0) return null;
  return (
    <section aria-label="Strips cut from sheet" className="mt-10 border-t border-rule pt-6">
      <h2 className="text-heading font-semibold">
        {strips.length} {strips.length === 1 ? 'strip' : 'strips'} cut from sheet, grain along them
      </h2>
      <Table caption="Strips cut from sheet" className="mt-2 max-w-3xl">
        <thead>
          <tr>
            <Th>Strip</Th>
            <Th>Wood</Th>
            <Th numeric>Long {units.label('length')}</Th>
            <Th numeric>Wide {units.label('length')}</Th>
            <Th numeric>Thick {units.label('length')}</Th>
            <Th className="hidden w-8 print:table-cell">cut</Th>
          </tr>
        </thead>
        <tbody>
          {strips.map((strip) => (
            <Tr key={strip.id}>
              <RowTh>{stickName(strip)}</RowTh>
              <Td>{plan.materials[strip.material]?.name ?? strip.material}</Td>
              <Td numeric>{size(strip.length)}</Td>
              <Td numeric>{size(strip.width)}</Td>
              <Td numeric>{size(strip.thickness)}</Td>
              <Td className="hidden print:table-cell">☐</Td>
            </Tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
