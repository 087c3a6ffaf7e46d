import { useState, type ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Plan } from '#shared/core/plan.ts';
import { cn } from '#client/lib/cn.ts';
import type { Units } from '#shared/format/units.ts';
import { whyBalance, type Why } from './why.ts';
import { whyNeutralPoint } from './why-neutral.ts';
import { WhyPanel } from './why-panel.tsx';

interface FactsProps {
  plan: Plan;
  result: Estimate;
  beam: Beam;
}

interface Fact {
  label: string;
  figure: ReactNode;
  why: Why | null;
}

/** The balance in figures, each to be asked how it was made. */
export function Facts({ plan, result, beam }: FactsProps) {
  const units = useUnits();
  const [asked, setAsked] = useState<string | null>(null);
  return (
    <section aria-label="Balance in figures">
      <h2 className="caption">Balance in figures</h2>
      <dl className="mt-1">
        {factsOf(plan, result, beam, units).map(({ label, figure, why }) => (
          <div
            key={label}
            className="grid min-h-row grid-cols-[auto_1fr] items-center gap-x-4 border-b border-rule"
          >
            <dt className="text-graphite">{label}</dt>
            <dd className="text-right font-semibold">
              {why ? (
                <button
                  type="button"
                  aria-expanded={asked === label}
                  onClick={() => setAsked(asked === label ? null : label)}
                  className={cn(
                    'min-h-row underline decoration-strong-rule decoration-dotted underline-offset-4 hover:text-ink hover:decoration-ink',
                    asked === label && 'text-ink decoration-ink',
                  )}
                >
                  {figure}
                  <span className="sr-only">: ask why</span>
                </button>
              ) : (
                figure
              )}
            </dd>
            {asked === label && why && (
              <dd className="col-span-2 pb-3">
                <WhyPanel why={why} />
              </dd>
            )}
          </div>
        ))}
      </dl>
    </section>
  );
}

function factsOf(plan: Plan, { totals, balance }: Estimate, beam: Beam, units: Units): Fact[] {
  const balanceWhy = whyBalance({ totals, balance }, beam.chord, units);
  const neutralWhy = whyNeutralPoint(plan, balance, units);
  const mac = beam.chord ? beam.chord.to - beam.chord.from : null;
  const np =
    mac === null || beam.chord === null || balance.neutralPoint === null
      ? null
      : (100 * (balance.neutralPoint - beam.chord.from)) / mac;
  return [
    {
      label: 'Balance point',
      figure: <Amount value={balance.x} u={balance.u} quantity="length" />,
      why: balanceWhy,
    },
    {
      label: 'of the mean aerodynamic chord',
      figure: <Amount value={balance.percentMac} u={balance.uPercentMac} quantity="percentMac" of="MAC" />,
      why: balanceWhy,
    },
    {
      label: 'Neutral point',
      figure: (
        <>
          <Amount value={balance.neutralPoint} quantity="length" />
          {np !== null && (
            <>
              {' · '}
              <Amount value={np} quantity="percentMac" of="MAC" />
            </>
          )}
        </>
      ),
      why: neutralWhy,
    },
    {
      label: 'Static margin',
      figure: <Amount value={balance.staticMargin} quantity="fineShare" of="MAC" />,
      why: neutralWhy,
    },
    { label: 'Mean aerodynamic chord', figure: <Amount value={mac} quantity="length" />, why: null },
    {
      label: 'its leading edge',
      figure: <Amount value={beam.chord?.from ?? null} quantity="length" />,
      why: null,
    },
  ];
}
