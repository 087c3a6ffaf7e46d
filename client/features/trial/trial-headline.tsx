import { Select } from '#client/components/ui/select.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Trial, TrialRun, TrialTerms } from '#shared/core/wood-trial.ts';
import { sentenceOf, stepOf } from './headline.ts';

interface TrialHeadlineProps {
  /** as drawn first, then one for each trial */
  tried: readonly Trial[];
  run: TrialRun;
  terms: TrialTerms;
  /** places in `tried` */
  from: number;
  to: number;
  onPair: (from: number, to: number) => void;
}

/** What going from one trial to another saves, after the nose weight; the two are chosen right beside it. */
export function TrialHeadline({ tried, run, terms, from, to, onPair }: TrialHeadlineProps) {
  const units = useUnits();
  const [before, after] = [run.results[from], run.results[to]];
  const [fromTrial, toTrial] = [tried[from], tried[to]];
  if (!before || !after || !fromTrial || !toTrial) return null;
  if (before.refused?.refused === 'no_mass') {
    return <Words headline="Nothing to compare yet" detail="The plan has no mass: draw its parts first." />;
  }
  if (tried.length < 2) {
    return <Words headline="As drawn" detail="Add a trial to see what another wood would save." />;
  }
  const said = sentenceOf(after.name, stepOf(before, after), units);
  const ask = (figure: 'bare' | 'allUp') =>
    ({ of: 'saving', figure, from: fromTrial, to: toTrial, terms }) as const;
  const options = tried.map(({ name }, i) => ({ value: String(i), label: name || 'without a name' }));
  return (
    <>
      <h1 className="max-w-5xl text-figure font-semibold text-balance">
        {said.before}
        {said.bare !== null && <Asked question={ask('bare')} text={said.bare} next={said.between} />}
        {said.bare === null && said.between}
        {said.allUp !== null && <Asked question={ask('allUp')} text={said.allUp} next={said.after} />}
        {said.allUp === null && said.after}
      </h1>
      <div className="mt-2 flex flex-wrap gap-x-4 gap-y-2 print:hidden">
        <div className="w-72 max-w-full">
          <Select
            label="From"
            keepRoom={false}
            value={String(from)}
            options={options}
            onValue={(value) => onPair(Number(value), to)}
          />
        </div>
        <div className="w-72 max-w-full">
          <Select
            label="To"
            keepRoom={false}
            value={String(to)}
            options={options}
            onValue={(value) => onPair(from, Number(value))}
          />
        </div>
      </div>
    </>
  );
}

/** A figure that can be asked, and the words after it, whose stop stays with it where the line breaks. */
function Asked({ question, text, next }: { question: WhyQuestion; text: string; next: string }) {
  const stop = /^[;,]/.test(next) ? next.slice(0, 1) : '';
  return (
    <>
      <span className="whitespace-nowrap">
        <AskWhy inText question={question}>
          {text}
        </AskWhy>
        {stop}
      </span>
      {next.slice(stop.length)}
    </>
  );
}

function Words({ headline, detail }: { headline: string; detail: string }) {
  return (
    <>
      <h1 className="text-figure font-semibold">{headline}</h1>
      <p className="mt-1 text-graphite">{detail}</p>
    </>
  );
}
