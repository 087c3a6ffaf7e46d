import { Fragment, useId, type ReactNode } from 'react';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { PrintedFigures, PrintedSheet } from '#shared/core/printed-sheet.ts';
import { formatNumber, NO_VALUE } from '#shared/format/numbers.ts';
import type { Why } from './why.ts';
import { WhyPanel } from './why-panel.tsx';

interface SheetTableProps {
  plan: Plan;
  sheet: PrintedSheet;
  /** keys of the groups that show their parts */
  open: ReadonlySet<string>;
  onToggle: (key: string) => void;
  /** key of the group that is lit on the beam */
  lit: string | null;
  selected: string | null;
  onSelect: (id: string | null) => void;
  /** what is being asked: `line/…`, `group/…` or `total` */
  asked: string | null;
  onAsk: (what: string | null) => void;
  why: (what: string) => Why | null;
}

/** Mass, arm and moment by group and part; every figure can be asked how it was made. */
export function SheetTable(props: SheetTableProps) {
  const { plan, sheet, open, onToggle, lit, selected, onSelect, asked, onAsk, why } = props;
  const units = useUnits();
  const row = (what: string, name: ReactNode, said: string, figures: PrintedFigures, look: RowLook) => (
    <FigureRow
      {...{ name, said, figures, look }}
      digits={sheet.digits}
      why={asked === what ? why(what) : null}
      onAsk={() => onAsk(asked === what ? null : what)}
    />
  );
  return (
    <Table caption="Balance sheet" className="tabular-nums">
      <thead>
        <tr>
          <Th>Group and part</Th>
          <Th numeric>Mass {units.label('mass')}</Th>
          <Th numeric className="max-sm:hidden">
            ±
          </Th>
          <Th numeric>Arm {units.label('length')}</Th>
          <Th numeric>Moment {units.label('moment')}</Th>
          <Th numeric className="max-sm:hidden">
            Share %
          </Th>
        </tr>
      </thead>
      <tbody>
        {sheet.groups.map((group) => {
          const isOpen = open.has(group.key);
          return (
            <Fragment key={group.key}>
              {row(
                `group/${group.key}`,
                <button
                  type="button"
                  aria-expanded={isOpen}
                  onClick={() => onToggle(group.key)}
                  className="-ml-1 flex min-h-row items-center gap-1.5 rounded-sm px-1 text-left font-semibold hover:text-ink"
                >
                  <Triangle open={isOpen} />
                  {group.name}
                </button>,
                group.name,
                group,
                { strong: true, lit: lit === group.key },
              )}
              {isOpen &&
                group.rows.map((part) => (
                  <Fragment key={part.id}>
                    {row(
                      `line/${part.id}`,
                      <button
                        type="button"
                        aria-pressed={selected === part.id}
                        onClick={() => onSelect(selected === part.id ? null : part.id)}
                        className="ml-4 flex min-h-row flex-col justify-center rounded-sm text-left hover:text-ink sm:flex-row sm:items-baseline sm:justify-start sm:gap-1.5 sm:py-1.5"
                      >
                        {part.name}
                        {part.material && (
                          <span className="text-note text-graphite">
                            {plan.materials[part.material]?.name}
                          </span>
                        )}
                      </button>,
                      part.name,
                      part,
                      { lit: lit === group.key || selected === part.id, picked: selected === part.id },
                    )}
                  </Fragment>
                ))}
            </Fragment>
          );
        })}
        {row('total', plan.name, plan.name, sheet.total, { strong: true, last: true })}
      </tbody>
    </Table>
  );
}

interface RowLook {
  strong?: boolean;
  lit?: boolean;
  picked?: boolean;
  last?: boolean;
}

interface FigureRowProps {
  name: ReactNode;
  /** the name alone, for the button's own */
  said: string;
  figures: PrintedFigures;
  digits: PrintedSheet['digits'];
  look: RowLook;
  why: Why | null;
  onAsk: () => void;
}

function FigureRow({ name, said, figures, digits, look, why, onAsk }: FigureRowProps) {
  const show = (text: string | null, column: keyof PrintedSheet['digits']) =>
    text === null ? NO_VALUE : formatNumber(Number(text), digits[column]);
  const line = look.last ? 'border-b-0 border-t border-t-strong-rule' : undefined;
  const id = useId();
  const units = useUnits();
  const under = (text: string) => (
    <span className="block text-label font-normal text-graphite sm:hidden"> {text}</span>
  );
  return (
    <>
      <Tr lit={look.lit ?? false} strong={look.strong ?? false}>
        <RowTh className={cn(line, 'py-0', look.picked && 'text-ink')}>{name}</RowTh>
        <Td numeric className={cn(line, 'pr-2')}>
          <button
            type="button"
            aria-expanded={why !== null}
            aria-controls={why ? id : undefined}
            onClick={onAsk}
            className={cn(
              '-mr-1 min-h-row rounded-sm px-1 underline decoration-strong-rule decoration-dotted underline-offset-4 hover:text-ink hover:decoration-ink',
              why && 'text-ink decoration-ink',
            )}
          >
            <span className="sr-only">{said} </span>
            {show(figures.mass, 'mass')}
            <span className="sr-only"> {units.label('mass')}, ask why</span>
            {under(`± ${show(figures.u, 'u')}`)}
          </button>
        </Td>
        <Td numeric className={cn(line, 'font-normal text-graphite max-sm:hidden')}>
          {show(figures.u, 'u')}
        </Td>
        <Td numeric className={line}>
          {show(figures.arm, 'arm')}
        </Td>
        <Td numeric className={line}>
          {show(figures.moment, 'moment')}
          {under(`${show(figures.share, 'share')} %`)}
        </Td>
        <Td numeric className={cn(line, 'max-sm:hidden')}>
          {show(figures.share, 'share')}
        </Td>
      </Tr>
      {why && (
        <tr id={id}>
          <td colSpan={6} className="border-b border-rule py-2 sm:pl-4">
            <WhyPanel why={why} />
          </td>
        </tr>
      )}
    </>
  );
}

function Triangle({ open }: { open: boolean }) {
  return (
    <svg
      viewBox="0 0 10 10"
      width="9"
      height="9"
      aria-hidden="true"
      className={open ? 'rotate-90' : undefined}
    >
      <path d="M1.5 0.5 9 5 1.5 9.5z" fill="currentColor" />
    </svg>
  );
}
