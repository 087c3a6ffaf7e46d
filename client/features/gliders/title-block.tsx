import { useId, useState, type ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { cn } from '#client/lib/cn.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { SaveStatus } from './save-status.tsx';
import { balanceVerdict } from './verdict.ts';

interface Cell {
  label: string;
  figure: ReactNode;
  note: ReactNode;
}

/** The one constant of every page of a glider: what is always wanted, at the lower right of the sheet. */
export function TitleBlock({ workspace }: { workspace: Workspace }) {
  const cells = cellsOf(workspace);
  return (
    <>
      <section
        aria-label="Title block"
        className="sticky bottom-0 z-10 mt-auto ml-auto hidden max-w-full border-t border-l border-strong-rule bg-sheet sm:flex print:static print:flex"
      >
        {cells.map((cell) => (
          <div key={cell.label} className="border-r border-rule px-3.5 py-2">
            <CellText {...cell} />
          </div>
        ))}
        <div className="flex flex-col justify-between px-3.5 py-2 text-note">
          <span className="text-label text-graphite">Glider</span>
          <strong className="max-w-48 truncate text-body font-semibold">{workspace.plan.name}</strong>
          <SaveStatus workspace={workspace} />
        </div>
      </section>
      <PhoneBar workspace={workspace} cells={cells} />
    </>
  );
}

/** On the phone a bar at the bottom that opens upward. */
function PhoneBar({ workspace, cells }: { workspace: Workspace; cells: Cell[] }) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const [mass, balance] = cells;
  return (
    <section
      aria-label="Title block"
      className="sticky bottom-0 z-10 mt-auto border-t border-strong-rule bg-sheet pb-[env(safe-area-inset-bottom)] sm:hidden print:hidden"
    >
      {open && (
        <div id={id}>
          <div className="grid grid-cols-2">
            {cells.map((cell) => (
              <div key={cell.label} className="border-r border-b border-rule px-3.5 py-2 even:border-r-0">
                <CellText {...cell} />
              </div>
            ))}
          </div>
          <p className="border-b border-rule px-3.5 py-2 text-note">
            <SaveStatus workspace={workspace} />
          </p>
        </div>
      )}
      <button
        type="button"
        aria-expanded={open}
        aria-controls={open ? id : undefined}
        onClick={() => setOpen(!open)}
        className="flex min-h-12 w-full items-center gap-4 px-3.5 text-left"
      >
        <strong className="font-semibold">{mass?.figure}</strong>
        <strong className="font-semibold">{balance?.figure}</strong>
        <span className="ml-auto truncate text-note">
          {open ? <span className="text-graphite">Close</span> : <SaveStatus workspace={workspace} brief />}
        </span>
        <svg
          viewBox="0 0 10 6"
          width="12"
          height="8"
          aria-hidden="true"
          className={cn('shrink-0', !open && 'rotate-180')}
        >
          <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.4" />
        </svg>
      </button>
    </section>
  );
}

function CellText({ label, figure, note }: Cell) {
  return (
    <>
      <div className="text-label text-graphite">{label}</div>
      <div className="text-figure font-semibold whitespace-nowrap">{figure}</div>
      <div className="min-h-[1.125rem] text-note whitespace-nowrap text-graphite">{note}</div>
    </>
  );
}

function cellsOf({ plan, result }: Workspace): Cell[] {
  const { totals, balance, loading } = result;
  const plusMinus = (value: number | null, quantity: 'mass' | 'percentMac') =>
    value === null ? null : `±\u202f${formatQuantity(value, quantity, { bare: true })}`;
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
