import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Built } from '#client/lib/built/use-built.ts';

/** What was held of each material, what the weighed parts said, and what is held now of its parts still to come. */
export function MaterialsSection({ built, plan }: { built: Built; plan: Plan }) {
  const units = useUnits();
  const news = built.account.materials.filter(({ evidence }) => evidence.length > 0);
  const belief = (mean: number, sd: number, key: string) => {
    const { density } = plan.materials[key] ?? {};
    const share = units.format(sd, 'fineShare');
    return density === undefined
      ? `${formatNumber(mean, 3)} ± ${share}`
      : `${units.format(mean * density, 'density')} ± ${share}`;
  };
  return (
    <section aria-label="What the weighed parts say of the wood" className="mt-10 border-t border-rule pt-6">
      <h2 className="text-heading font-semibold">What the weighed parts say of the wood still to come</h2>
      {news.length === 0 ? (
        <p className="text-graphite">Nothing yet: the first weighed part of a wood tells of the next.</p>
      ) : (
        <>
          <p className="max-w-prose text-note text-graphite">
            Half of a material’s spread is taken as common to all its parts, half as each part’s own. A
            weighing moves the common half (normal prior and reading, precisions add).
          </p>
          <Table caption="Materials before and after weighing" className="mt-2 max-w-4xl">
            <thead>
              <tr>
                <Th>Material</Th>
                <Th numeric>Before</Th>
                <Th numeric>Weighed over drawn</Th>
                <Th numeric>Now</Th>
                <Th numeric>To come {units.label('mass')}</Th>
              </tr>
            </thead>
            <tbody>
              {news.map(({ key, name, prior, evidence, posterior, toCome }) => (
                <Tr key={key}>
                  <RowTh>{name}</RowTh>
                  <Td numeric>{belief(prior.mean, prior.sd, key)}</Td>
                  <Td numeric>
                    {evidence.map(({ weighing, ratio, u, mixed }) => (
                      <span key={weighing} className="block">
                        {formatNumber(ratio, 3)} ± {units.format(u, 'fineShare')}
                        {mixed && ' (with others)'}
                      </span>
                    ))}
                  </Td>
                  <Td numeric className="font-semibold">
                    {belief(posterior.mean, posterior.sd, key)}
                  </Td>
                  <Td numeric>{units.format(toCome, 'mass', { bare: true })}</Td>
                </Tr>
              ))}
            </tbody>
          </Table>
        </>
      )}
    </section>
  );
}
