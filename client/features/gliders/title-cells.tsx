import type { ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import type { Workspace } from '#client/lib/workspace.ts';
import { formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import { balanceVerdict } from './verdict.ts';

export interface Cell {
  label: string;
  figure: ReactNode;
  note: ReactNode;
}

export function CellText({ label, figure, note }: Cell) {
  return (
    <>
      <div className="text-label text-graphite">{label}</div>
      <div className="text-figure font-semibold whitespace-nowrap">{figure}</div>
      <div className="min-h-[1.125rem] text-note text-graphite sm:whitespace-nowrap">{note}</div>
    </>
  );
}

/** Mass, balance, loading and margin, as the title block tells them. */
export function cellsOf({ plan, result }: Workspace): Cell[] {
  const { totals, balance, loading } = result;
  const plusMinus = (value: number | null, quantity: 'mass' | 'percentMac') =>
    value === null ? null : `±${NARROW_SPACE}${formatQuantity(value, quantity, { bare: true })}`;
  const neutralPoint =
    balance.percentMac === null || balance.staticMargin === null
      ? null
      : balance.percentMac + balance.staticMargin * 100;
  return [
    {
      label: 'Mass',
      figure: <Amount value={totals.mass} quantity="mass" flash />,
      note: plusMinus(totals.u, 'mass'),
    },
    {
      label: 'Balance',
      figure: <Amount value={balance.percentMac} quantity="percentMac" of="MAC" flash />,
      note: (
        <BalanceNote plan={plan} result={result} plusMinus={plusMinus(balance.uPercentMac, 'percentMac')} />
      ),
    },
    {
      label: 'Wing loading',
      figure: <Amount value={loading.wing} quantity="loading" flash />,
      note: loading.wing === null ? null : formatQuantity(loading.wing, 'loading', { unit: 'oz/ft2' }),
    },
    {
      label: 'Static margin',
      figure: <Amount value={balance.staticMargin} quantity="fineShare" flash />,
      note:
        neutralPoint === null
          ? 'needs a tailplane'
          : `neutral point ${formatQuantity(neutralPoint, 'percentMac')}`,
    },
  ];
}

interface BalanceNoteProps extends Pick<Workspace, 'plan' | 'result'> {
  plusMinus: string | null;
}

function BalanceNote({ plan, result, plusMinus }: BalanceNoteProps) {
  const verdict = balanceVerdict(plan, result);
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
