import type { ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Estimate } from '#shared/core/result.ts';

interface FactsProps {
  result: Estimate;
  beam: Beam;
}

interface Fact {
  label: string;
  figure: ReactNode;
  /** null where there is no figure to ask about */
  question: WhyQuestion | null;
}

/** The balance in figures, each to be asked how it was made. */
export function Facts({ result, beam }: FactsProps) {
  return (
    <section aria-label="Balance in figures">
      <h2 className="caption">Balance in figures</h2>
      <dl className="mt-1">
        {factsOf(result, beam).map(({ label, figure, question }) => (
          <div key={label} className="flex min-h-row flex-wrap items-center gap-x-4 border-b border-rule">
            <dt className="text-graphite">{label}</dt>
            <dd className="ml-auto text-right font-semibold">
              {question ? (
                <AskWhy question={question} name={label}>
                  {figure}
                </AskWhy>
              ) : (
                figure
              )}
            </dd>
          </div>
        ))}
      </dl>
    </section>
  );
}

function factsOf({ balance }: Estimate, beam: Beam): Fact[] {
  const mac = beam.chord ? beam.chord.to - beam.chord.from : null;
  const np =
    mac === null || beam.chord === null || balance.neutralPoint === null
      ? null
      : (100 * (balance.neutralPoint - beam.chord.from)) / mac;
  const asked = (question: WhyQuestion, there: number | null) => (there === null ? null : question);
  return [
    {
      label: 'Balance point',
      figure: <Amount value={balance.x} u={balance.u} quantity="length" />,
      question: asked({ of: 'balance' }, balance.x),
    },
    {
      label: 'of the mean aerodynamic chord',
      figure: <Amount value={balance.percentMac} u={balance.uPercentMac} quantity="percentMac" of="MAC" />,
      question: asked({ of: 'balance' }, balance.percentMac),
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
      question: asked({ of: 'neutralPoint' }, balance.neutralPoint),
    },
    {
      label: 'Static margin',
      figure: <Amount value={balance.staticMargin} quantity="fineShare" of="MAC" />,
      question: asked({ of: 'staticMargin' }, balance.staticMargin),
    },
    {
      label: 'Mean aerodynamic chord',
      figure: <Amount value={mac} quantity="length" />,
      question: asked({ of: 'chord' }, mac),
    },
    {
      label: 'its leading edge',
      figure: <Amount value={beam.chord?.from ?? null} quantity="length" />,
      question: asked({ of: 'chord' }, mac),
    },
  ];
}
