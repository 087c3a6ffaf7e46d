import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { RibBlank } from '#shared/core/cut/cut-list.ts';
import type { Plan } from '#shared/core/plan.ts';
import { stickName } from './words.ts';

/** The blanks that ribs are cut from, grain along the chord: one row for port and starboard alike. */
export function RibSection({ plan, ribs }: { plan: Plan; ribs: readonly RibBlank[] }) {
  const units = useUnits();
  const size = (mm: number) => units.format(mm, 'length', { bare: true });
  const rows = ribs.filter(
    ({ side }) => side !== 'port' || !ribs.some(({ side: other }) => other === 'starboard'),
  );
  return (
    <section aria-label="Rib blanks" className="mt-10 border-t border-rule pt-6">
      <h2 className="text-heading font-semibold">{ribs.length} rib blanks, grain along the chord</h2>
      <p className="text-note text-graphite">
        Between leading and trailing edge, as high as the section; a saw’s width all round comes on top.
      </p>
      <Table caption="Rib blanks" className="mt-2 max-w-3xl">
        <thead>
          <tr>
            <Th>Rib</Th>
            <Th>Wood</Th>
            <Th numeric>Pieces</Th>
            <Th numeric>Long {units.label('length')}</Th>
            <Th numeric>High {units.label('length')}</Th>
            <Th numeric>Thick {units.label('length')}</Th>
            <Th className="hidden w-8 print:table-cell">cut</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map((rib) => (
            <Tr key={rib.id}>
              <RowTh>
                {stickName({ name: rib.name, side: 'middle', panel: null })}, {rib.number}
              </RowTh>
              <Td>{plan.materials[rib.material]?.name ?? rib.material}</Td>
              <Td numeric>
                {ribs.filter(({ line, number }) => line === rib.line && number === rib.number).length}
              </Td>
              <Td numeric>{size(rib.length)}</Td>
              <Td numeric>{size(rib.height)}</Td>
              <Td numeric>{size(rib.thickness)}</Td>
              <Td className="hidden print:table-cell">☐</Td>
            </Tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
