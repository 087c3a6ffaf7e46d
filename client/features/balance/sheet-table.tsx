import { Fragment, type ReactNode } from 'react';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { PrintedFigures, PrintedSheet } from '#shared/core/printed-sheet.ts';
import { formatNumber, NO_VALUE } from '#shared/format/numbers.ts';

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
}

/** Mass, arm and moment by group and part; every figure can be asked how it was made. */
export function SheetTable(props: SheetTableProps) {
  const { plan, sheet, open, onToggle, lit, selected, onSelect } = props;
  const units = useUnits();
  const row = (
    question: WhyQuestion,
    name: ReactNode,
    said: string,
    figures: PrintedFigures,
    look: RowLook,
  ) => <FigureRow {...{ question, name, said, figures, look }} digits={sheet.digits} />;
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
                { of: 'group', key: group.key },
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
                      { of: 'line', id: part.id },
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
        {row({ of: 'total' }, plan.name, plan.name, sheet.total, { strong: true, last: true })}
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
  question: WhyQuestion;
  name: ReactNode;
  /** the name alone, for the button's own */
  said: string;
  figures: PrintedFigures;
  digits: PrintedSheet['digits'];
  look: RowLook;
}

function FigureRow({ question, name, said, figures, digits, look }: FigureRowProps) {
  const show = (text: string | null, column: keyof PrintedSheet['digits']) =>
    text === null ? NO_VALUE : formatNumber(Number(text), digits[column]);
  const units = useUnits();
  const line = look.last ? 'border-b-0 border-t border-t-strong-rule' : undefined;
  const under = (text: string) => (
    <span className="block text-label font-normal text-graphite sm:hidden"> {text}</span>
  );
  // One answer tells of all figures of a line, so that the first alone is a stop for the keyboard.
  const also = (figure: ReactNode) => (
    <AskWhy question={question} second>
      {figure}
    </AskWhy>
  );
  return (
    <Tr lit={look.lit ?? false} strong={look.strong ?? false}>
      <RowTh className={cn(line, 'py-0', look.picked && 'text-ink')}>{name}</RowTh>
      <Td numeric className={cn(line, 'pr-2')}>
        <AskWhy question={question} name={said} className="-mr-1 px-1">
          {show(figures.mass, 'mass')}
          <span className="sr-only"> {units.label('mass')}</span>
          {under(`± ${show(figures.u, 'u')}`)}
        </AskWhy>
      </Td>
      <Td numeric className={cn(line, 'font-normal text-graphite max-sm:hidden')}>
        {also(show(figures.u, 'u'))}
      </Td>
      <Td numeric className={line}>
        {also(show(figures.arm, 'arm'))}
      </Td>
      <Td numeric className={line}>
        {also(
          <>
            {show(figures.moment, 'moment')}
            {under(`${show(figures.share, 'share')} %`)}
          </>,
        )}
      </Td>
      <Td numeric className={cn(line, 'max-sm:hidden')}>
        {also(show(figures.share, 'share'))}
      </Td>
    </Tr>
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
