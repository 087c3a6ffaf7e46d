import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate, Planform } from '#shared/core/result.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import { formatQuantity } from '#shared/format/numbers.ts';

const mm = (value: number) => formatQuantity(value, 'length', { bare: true });
const dm2 = (value: number) => formatQuantity(value, 'area', { bare: true });

/** What is told of each surface. An upright fin has no shadow, so no projected area and span. */
const FIGURES: readonly { label: string; of: (planform: Planform) => string }[] = [
  { label: 'Area, projected dm²', of: ({ areaProjected }) => (areaProjected > 0 ? dm2(areaProjected) : '–') },
  { label: 'Area, developed dm²', of: ({ areaDeveloped }) => dm2(areaDeveloped) },
  { label: 'Span, projected mm', of: ({ span }) => (span > 0 ? mm(span) : '–') },
  { label: 'Aspect ratio', of: ({ aspectRatio }) => formatQuantity(aspectRatio, 'ratio') },
  { label: 'Mean aerodynamic chord mm', of: ({ mac }) => mm(mac) },
  { label: 'its leading edge, x mm', of: ({ xLeMac }) => mm(xLeMac) },
  { label: 'and place along the span, y mm', of: ({ yMac }) => mm(yMac) },
];

/** Areas, spans and mean chords of all surfaces. */
export function PlanformTable({ plan, result }: { plan: Plan; result: Estimate }) {
  const surfaces = plan.surfaces.flatMap(({ key }) => {
    const planform = result.planform[key];
    return planform ? [{ key, planform }] : [];
  });
  if (surfaces.length === 0) return null;
  return (
    <section aria-label="Planform">
      <h2 className="caption">Planform</h2>
      <Table caption="Planform of each surface">
        <thead>
          <tr>
            <Th>Figure</Th>
            {surfaces.map(({ key }) => (
              <Th key={key} numeric>
                {sheetGroupName(key)}
              </Th>
            ))}
          </tr>
        </thead>
        <tbody>
          {FIGURES.map(({ label, of }) => (
            <tr key={label}>
              <RowTh>{label}</RowTh>
              {surfaces.map(({ key, planform }) => (
                <Td key={key} numeric>
                  {of(planform)}
                </Td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
      <p className="mt-2 text-note text-graphite">
        Tip blocks are counted in. MAC = ∫c² ds ÷ ∫c ds; its leading edge is the chord-weighted mean of the
        real one, which on a cranked wing is not the leading edge at that y.
      </p>
    </section>
  );
}
