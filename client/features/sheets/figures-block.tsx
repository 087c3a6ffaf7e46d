import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

interface FiguresBlockProps {
  plan: Plan;
  result: Pick<Estimate, 'planform' | 'totals' | 'balance' | 'loading' | 'speeds'>;
}

type Pairs = readonly (readonly [label: string, figure: string])[];

/** Balance, loading and planform in figures, three columns of the page. */
export function FiguresBlock({ plan, result }: FiguresBlockProps) {
  const units = useUnits();
  return (
    <div className="grid gap-x-[6mm] gap-y-[3mm] text-[2.9mm]/[4.2mm] sm:grid-cols-3 print:grid-cols-3">
      <Block title="Balance" pairs={balancePairs(plan, result, units)} />
      <Block title="Loading and flight" pairs={flightPairs(plan, result, units)} />
      <Block title="Planform" pairs={planformPairs(plan, result, units)} />
    </div>
  );
}

function Block({ title, pairs }: { title: string; pairs: Pairs }) {
  return (
    <section>
      <h2 className="border-b border-graphite font-semibold">{title}</h2>
      <dl>
        {pairs.map(([label, figure]) => (
          <div key={label} className="flex justify-between gap-2 border-b border-rule">
            <dt className="text-graphite">{label}</dt>
            <dd className="text-right whitespace-nowrap">{figure}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}

const withU = (figure: string, u: string) => `${figure} ±${NARROW_SPACE}${u}`;

function balancePairs({ target }: Plan, { balance }: FiguresBlockProps['result'], units: Units): Pairs {
  const { x, u, percentMac, uPercentMac, neutralPoint, staticMargin } = balance;
  return [
    [
      'Balance point',
      x === null ? '–' : withU(units.format(x, 'length', { bare: true }), units.doubt(u, 'length')),
    ],
    [
      'of the MAC',
      percentMac === null ? '–' : withU(formatNumber(percentMac, 1), units.format(uPercentMac, 'percentMac')),
    ],
    [
      'wanted',
      target
        ? withU(formatNumber(target.percentMac, 1), units.format(target.tolerance, 'percentMac'))
        : 'not asked for',
    ],
    ['Neutral point', units.format(neutralPoint, 'length')],
    ['Static margin', units.format(staticMargin, 'fineShare')],
  ];
}

function flightPairs(
  { flight }: Plan,
  { loading, speeds }: FiguresBlockProps['result'],
  units: Units,
): Pairs {
  return [
    ['Wing loading', units.format(loading.wing, 'loading')],
    ['Class area', units.format(loading.classArea, 'classArea')],
    ['Class loading', units.format(loading.classLoading, 'loading')],
    [`Stall, lift coeff. ${formatNumber(flight?.clMax ?? 1, 2)}`, units.format(speeds.stall, 'speed')],
    ['Reynolds number there', units.format(speeds.reynolds, 'reynolds')],
  ];
}

function planformPairs({ surfaces }: Plan, { planform }: FiguresBlockProps['result'], units: Units): Pairs {
  const mm = (value: number | null) => units.format(value, 'length');
  const of = (role: 'wing' | 'tailplane') => {
    const key = surfaces.find((surface) => surface.role === role)?.key;
    return key === undefined ? undefined : planform[key];
  };
  const wing = of('wing');
  const tail = of('tailplane');
  return [
    ['Wing area, projected', units.format(wing?.areaProjected, 'area')],
    ['Span', mm(wing?.span ?? null)],
    ['Aspect ratio', units.format(wing?.aspectRatio, 'ratio')],
    [
      'MAC, leading edge at',
      wing ? `${units.format(wing.mac, 'length', { bare: true })}, ${mm(wing.xLeMac)}` : '–',
    ],
    ['Tailplane area', units.format(tail?.areaProjected, 'area')],
  ];
}
