import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { ShoppingLine } from './shopping.ts';

/** What to buy, in the sizes that shops sell, with a box to tick on paper. */
export function ShoppingSection({ plan, lines }: { plan: Plan; lines: readonly ShoppingLine[] }) {
  const units = useUnits();
  const sizes = (all: readonly (number | null)[]) => {
    const known = all.filter((mm) => mm !== null);
    return known.map((mm, i) => units.size(mm, { bare: i < known.length - 1 })).join(' × ');
  };
  return (
    <section aria-label="To buy" className="mt-6">
      <h2 className="text-heading font-semibold">To buy</h2>
      {lines.length === 0 ? (
        <p className="text-graphite">Nothing: all of it is cut from what is at hand.</p>
      ) : (
        <>
          <Table caption="To buy" className="mt-1 max-w-3xl">
            <thead>
              <tr>
                <Th className="hidden w-8 print:table-cell">
                  <span className="sr-only">Bought</span>
                </Th>
                <Th>Wood</Th>
                <Th numeric>How many</Th>
                <Th>As it is sold</Th>
                <Th>Drawn</Th>
              </tr>
            </thead>
            <tbody>
              {lines.map(({ key, material, form, count, sold, drawn, isThicker }) => (
                <Tr key={key}>
                  <Td className="hidden print:table-cell">☐</Td>
                  <RowTh>{plan.materials[material]?.name ?? material}</RowTh>
                  <Td numeric>{count}</Td>
                  <Td>
                    {form} {sizes([sold.length, sold.width, sold.thickness])}
                  </Td>
                  <Td className="text-graphite">
                    {form === 'block' ? 'at least that' : sizes([drawn.width, drawn.thickness])}
                    {form === 'sheet' && ' thick'}
                    {isThicker && ': take it down'}
                  </Td>
                </Tr>
              ))}
            </tbody>
          </Table>
          <p className="mt-1 text-note text-graphite">
            Sizes as model shops usually have them; look at what yours sells before you go.
          </p>
        </>
      )}
    </section>
  );
}
