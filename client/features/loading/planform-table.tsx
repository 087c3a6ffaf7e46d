import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { PlanformFigure } from '#client/lib/why/question.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate, Planform } from '#shared/core/result.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import { NO_VALUE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

interface Figure {
  figure: PlanformFigure;
  label: string;
  /** null where the surface has none */
  of: (planform: Planform) => string | null;
}

/** What is told of each surface. An upright fin has no shadow, so no projected area and span. */
function figuresIn(units: Units): Figure[] {
  const long = (value: number) => units.format(value, 'length', { bare: true });
  const wide = (value: number) => units.format(value, 'area', { bare: true });
  const [length, area] = [units.label('length'), units.label('area')];
  return [
    {
      figure: 'areaProjected',
      label: `Area, projected ${area}`,
      of: ({ areaProjected }) => (areaProjected > 0 ? wide(areaProjected) : null),
    },
    {
      figure: 'areaDeveloped',
      label: `Area, developed ${area}`,
      of: ({ areaDeveloped }) => wide(areaDeveloped),
    },
    {
      figure: 'span',
      label: `Span, projected ${length}`,
      of: ({ span }) => (span > 0 ? long(span) : null),
    },
    {
      figure: 'aspectRatio',
      label: 'Aspect ratio',
      of: ({ aspectRatio }) => (aspectRatio === null ? null : units.format(aspectRatio, 'ratio')),
    },
    { figure: 'mac', label: `Mean aerodynamic chord ${length}`, of: ({ mac }) => long(mac) },
    { figure: 'xLeMac', label: `its leading edge, x ${length}`, of: ({ xLeMac }) => long(xLeMac) },
    { figure: 'yMac', label: `and place along the span, y ${length}`, of: ({ yMac }) => long(yMac) },
  ];
}

/** Areas, spans and mean chords of all surfaces. */
export function PlanformTable({ plan, result }: { plan: Plan; result: Estimate }) {
  const units = useUnits();
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
          {figuresIn(units).map(({ figure, label, of }) => (
            <tr key={label}>
              <RowTh>{label}</RowTh>
              {surfaces.map(({ key, planform }) => {
                const text = of(planform);
                return (
                  <Td key={key} numeric>
                    {text === null ? (
                      NO_VALUE
                    ) : (
                      <AskWhy question={{ of: 'planform', surface: key, figure }}>{text}</AskWhy>
                    )}
                  </Td>
                );
              })}
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
