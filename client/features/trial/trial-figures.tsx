import type { ReactNode } from 'react';
import { RowTh, Td, Tr } from '#client/components/ui/table.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { TrialFigure } from '#client/lib/why/question.ts';
import type { Trial, TrialRefusal, TrialResult } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';

const ROWS: readonly {
  figure: TrialFigure;
  label: string;
  quantity: Quantity;
  strong?: boolean;
  fine?: boolean;
}[] = [
  { figure: 'wingMass', label: 'Wing', quantity: 'mass' },
  { figure: 'bare', label: 'All but ballast', quantity: 'mass' },
  { figure: 'percentMac', label: 'Balance before trim, MAC', quantity: 'percentMac' },
  { figure: 'ballast', label: 'Ballast that trims it', quantity: 'mass' },
  { figure: 'allUp', label: 'All up', quantity: 'mass', strong: true },
  { figure: 'wingLoading', label: 'Wing loading', quantity: 'loading', fine: true },
];

interface TrialFiguresProps {
  /** as drawn first */
  trials: readonly Trial[];
  results: readonly TrialResult[];
  /** where the ballast is put, mm */
  arm: number;
}

/** What each trial comes to, and how far it is from the plan as drawn. */
export function TrialFigures({ trials, results, arm }: TrialFiguresProps) {
  const [drawn] = results;
  const units = useUnits();
  return (
    <tbody className="[&>tr:first-child>*]:border-t [&>tr:first-child>*]:border-t-strong-rule">
      {ROWS.map(({ figure, label, quantity, strong = false, fine = false }) => (
        <Tr key={figure} strong={strong}>
          <RowTh className="sticky left-0 z-1 bg-sheet max-sm:py-1 max-sm:text-note">{label}</RowTh>
          {results.map((result, index) => {
            const value = result[figure];
            const base = drawn?.[figure] ?? null;
            return (
              <Td key={index} numeric>
                {value === null && figure === 'ballast' ? (
                  <span className="text-note font-normal whitespace-normal text-red">
                    <span aria-hidden="true">▲ </span>
                    {refusalText(result.refused, units)}
                  </span>
                ) : (
                  <Figure figure={figure} trial={trials[index]} arm={arm} there={value !== null}>
                    {units.format(value, quantity, { fine })}
                  </Figure>
                )}
                {index > 0 && value !== null && base !== null && (
                  <span className="text-note font-normal text-graphite max-sm:block sm:ml-2 sm:inline-block sm:min-w-12">
                    {units.format(value - base, quantity, { bare: true, plus: true, fine })}
                  </span>
                )}
              </Td>
            );
          })}
        </Tr>
      ))}
    </tbody>
  );
}

interface FigureProps {
  figure: TrialFigure;
  trial: Trial | undefined;
  arm: number;
  there: boolean;
  children: ReactNode;
}

function Figure({ figure, trial, arm, there, children }: FigureProps) {
  if (!trial || !there) return children;
  return <AskWhy question={{ of: 'trial', figure, trial, arm }}>{children}</AskWhy>;
}

function refusalText(refused: TrialRefusal | null, units: Units): string {
  switch (refused?.refused) {
    case 'at_wanted_point':
      return 'none: the arm lies on the balance point';
    case 'wrong_side':
      return refused.takeOff === null
        ? 'none: nose-heavy without any'
        : `none: ${units.format(refused.takeOff, 'mass')} too heavy there already`;
    default:
      return '–';
  }
}
