import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatNumber, formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';

interface FiguresBlockProps {
  plan: Plan;
  result: Pick<Estimate, 'planform' | 'totals' | 'balance' | 'loading' | 'speeds'>;
}

type Pairs = readonly (readonly [label: string, figure: string])[];

/** Balance, loading and planform in figures, three columns of the page. */
export function FiguresBlock({ plan, result }: FiguresBlockProps) {
  return (
    <div className="grid gap-x-[6mm] gap-y-[3mm] text-[2.9mm]/[4.2mm] sm:grid-cols-3 print:grid-cols-3">
      <Block title="Balance" pairs={balancePairs(plan, result)} />
      <Block title="Loading and flight" pairs={flightPairs(plan, result)} />
      <Block title="Planform" pairs={planformPairs(plan, result)} />
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

const mm = (value: number | null) => formatQuantity(value, 'length');
const withU = (figure: string, u: string) => `${figure} ±${NARROW_SPACE}${u}`;

function balancePairs({ target }: Plan, { balance }: FiguresBlockProps['result']): Pairs {
  const { x, u, percentMac, uPercentMac, neutralPoint, staticMargin } = balance;
  return [
    ['Balance point', x === null ? '–' : withU(formatNumber(x, 1), mm(u))],
    [
      'of the MAC',
      percentMac === null
        ? '–'
        : withU(formatNumber(percentMac, 1), formatQuantity(uPercentMac, 'percentMac')),
    ],
    [
      'wanted',
      target
        ? withU(formatNumber(target.percentMac, 1), formatQuantity(target.tolerance, 'percentMac'))
        : 'not asked for',
    ],
    ['Neutral point', mm(neutralPoint)],
    ['Static margin', formatQuantity(staticMargin, 'fineShare')],
  ];
}

function flightPairs({ flight }: Plan, { loading, speeds }: FiguresBlockProps['result']): Pairs {
  return [
    ['Wing loading', formatQuantity(loading.wing, 'loading')],
    ['Class area', formatQuantity(loading.classArea, 'classArea')],
    ['Class loading', formatQuantity(loading.classLoading, 'loading')],
    [`Stall, lift coeff. ${formatNumber(flight?.clMax ?? 1, 2)}`, formatQuantity(speeds.stall, 'speed')],
    ['Reynolds number there', formatQuantity(speeds.reynolds, 'reynolds')],
  ];
}

function planformPairs({ surfaces }: Plan, { planform }: FiguresBlockProps['result']): Pairs {
  const of = (role: 'wing' | 'tailplane') => {
    const key = surfaces.find((surface) => surface.role === role)?.key;
    return key === undefined ? undefined : planform[key];
  };
  const wing = of('wing');
  const tail = of('tailplane');
  return [
    ['Wing area, projected', formatQuantity(wing?.areaProjected, 'area')],
    ['Span', mm(wing?.span ?? null)],
    ['Aspect ratio', formatQuantity(wing?.aspectRatio, 'ratio')],
    ['MAC, leading edge at', wing ? `${formatNumber(wing.mac, 1)}, ${mm(wing.xLeMac)}` : '–'],
    ['Tailplane area', formatQuantity(tail?.areaProjected, 'area')],
  ];
}
