import type { ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { balanceVerdict } from './verdict.ts';

export interface Cell {
  label: string;
  figure: ReactNode;
  /** null where there is no figure to ask about */
  question: WhyQuestion | null;
  note: ReactNode;
}

export function CellText({ label, figure, question, note }: Cell) {
  return (
    <>
      <div className="text-label text-graphite">{label}</div>
      <div className="text-figure font-semibold whitespace-nowrap">
        {question ? (
          <AskWhy question={question} name={label}>
            {figure}
          </AskWhy>
        ) : (
          figure
        )}
      </div>
      <div className="min-h-[1.125rem] text-note text-graphite sm:whitespace-nowrap">{note}</div>
    </>
  );
}

/** Mass, balance, loading and margin, as the title block tells them. */
export function cellsOf({ plan, result }: Workspace, units: Units): Cell[] {
  const { totals, balance, loading } = result;
  const plusMinus = (value: number | null, quantity: 'mass' | 'percentMac') =>
    value === null ? null : `±${NARROW_SPACE}${units.doubt(value, quantity, { bare: true })}`;
  const asked = (question: WhyQuestion, there: number | null) => (there === null ? null : question);
  const neutralPoint =
    balance.percentMac === null || balance.staticMargin === null
      ? null
      : balance.percentMac + balance.staticMargin * 100;
  return [
    {
      label: 'Mass',
      figure: <Amount value={totals.mass} quantity="mass" flash />,
      question: asked({ of: 'total' }, totals.mass),
      note: plusMinus(totals.u, 'mass'),
    },
    {
      label: 'Balance',
      figure: <Amount value={balance.percentMac} quantity="percentMac" of="MAC" flash />,
      question: asked({ of: 'balance' }, balance.percentMac),
      note: (
        <BalanceNote plan={plan} result={result} plusMinus={plusMinus(balance.uPercentMac, 'percentMac')} />
      ),
    },
    {
      label: 'Wing loading',
      figure: <Amount value={loading.wing} quantity="loading" flash />,
      question: asked({ of: 'loading', kind: 'projected' }, loading.wing),
      note: otherLoading(loading.wing, units),
    },
    {
      label: 'Static margin',
      figure: <Amount value={balance.staticMargin} quantity="fineShare" flash />,
      question: asked({ of: 'staticMargin' }, balance.staticMargin),
      note:
        neutralPoint === null
          ? 'needs a tailplane'
          : `neutral point ${units.format(neutralPoint, 'percentMac')}`,
    },
  ];
}

/** The loading as the other half of the trade tells it. */
function otherLoading(loading: number | null, units: Units): string | null {
  const unit = units.other('loading');
  return loading === null || unit === null ? null : units.format(loading, 'loading', { unit });
}

interface BalanceNoteProps extends Pick<Workspace, 'plan' | 'result'> {
  plusMinus: string | null;
}

function BalanceNote({ plan, result, plusMinus }: BalanceNoteProps) {
  const verdict = balanceVerdict(plan, result, useUnits());
  if (verdict === null) return plusMinus;
  if (verdict.kind === 'inside') return [plusMinus, verdict.text].filter(Boolean).join(' · ');
  const out = verdict.kind === 'outside';
  return (
    <span className={out ? 'text-red' : 'text-ochre'}>
      <span aria-hidden="true">{out ? '▲ ' : '◆ '}</span>
      {verdict.text}
    </span>
  );
}
