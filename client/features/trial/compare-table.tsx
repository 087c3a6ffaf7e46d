import type { ReactNode } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useMedia } from '#client/hooks/use-media.ts';
import type { Trial, TrialResult, TrialTerms } from '#shared/core/wood-trial.ts';
import { COLUMNS } from './columns.ts';
import { TrialFigureCell } from './trial-figure.tsx';

interface CompareTableProps {
  /** as drawn first, then one for each trial; results likewise */
  tried: readonly Trial[];
  results: readonly TrialResult[];
  terms: TrialTerms;
  /** of keeping the limits of mass and balance, in words; empty where none is set */
  chances: readonly string[];
  /** what nothing beats */
  best: readonly boolean[];
  picked: number;
  onPick: (index: number) => void;
}

/** Trials side by side; on a narrow screen a card each. */
export function CompareTable(props: CompareTableProps) {
  const narrow = useMedia('(max-width: 60rem)');
  return narrow ? <Cards {...props} /> : <Rows {...props} />;
}

const BEST = 'Nothing better in both';

function Name({ index, tried, best, picked, onPick }: { index: number } & CompareTableProps): ReactNode {
  const name = tried[index]?.name || 'without a name';
  return (
    <>
      {index === 0 ? (
        <span className="font-semibold">{name}</span>
      ) : (
        <Button
          variant="plain"
          className="-ml-3 max-w-56 justify-start text-left pointer-coarse:-ml-3.5"
          aria-pressed={picked === index}
          onClick={() => onPick(index)}
        >
          <span className="[overflow-wrap:anywhere]">{name}</span>
        </Button>
      )}
      {best[index] && (
        <span className="block text-label text-graphite">
          <span aria-hidden="true">◆ </span>
          {BEST}
        </span>
      )}
    </>
  );
}

function Rows(props: CompareTableProps) {
  const { tried, results, terms, chances, picked } = props;
  const withChances = chances.some((text) => text !== '');
  return (
    <Table caption="Wood trials side by side" className="mt-2">
      <thead>
        <tr>
          <Th>Trial</Th>
          {COLUMNS.map(({ figure, label }) => (
            <Th key={figure} numeric>
              {label}
            </Th>
          ))}
          {withChances && <Th numeric>Chance of limits</Th>}
        </tr>
      </thead>
      <tbody>
        {results.map((result, index) => {
          const trial = tried[index];
          if (!trial) return null;
          return (
            <Tr key={index} lit={index > 0 && index === picked}>
              <RowTh className="min-w-36 py-1">
                <Name {...props} index={index} />
              </RowTh>
              {COLUMNS.map((column) => (
                <Td key={column.figure} numeric className={column.strong ? 'font-semibold' : 'align-middle'}>
                  <TrialFigureCell
                    column={column}
                    trial={trial}
                    result={result}
                    drawn={index > 0 ? (results[0] ?? null) : null}
                    terms={terms}
                  />
                </Td>
              ))}
              {withChances && <Td numeric>{chances[index] || '–'}</Td>}
            </Tr>
          );
        })}
      </tbody>
    </Table>
  );
}

function Cards(props: CompareTableProps) {
  const { tried, results, terms, chances, picked } = props;
  return (
    <ul aria-label="Wood trials side by side" className="mt-2 grid gap-4 sm:grid-cols-2">
      {results.map((result, index) => {
        const trial = tried[index];
        if (!trial) return null;
        return (
          <li
            key={index}
            className={`border p-3 ${index > 0 && index === picked ? 'border-ink' : 'border-rule'}`}
          >
            <Name {...props} index={index} />
            <dl className="mt-1 grid grid-cols-[1fr_auto] gap-x-3">
              {COLUMNS.map((column) => (
                <div
                  key={column.figure}
                  className="col-span-2 grid grid-cols-subgrid items-center border-t border-rule py-0.5"
                >
                  <dt className="text-note text-graphite">{column.label}</dt>
                  <dd className={column.strong ? 'text-right font-semibold' : 'text-right'}>
                    <TrialFigureCell
                      column={column}
                      trial={trial}
                      result={result}
                      drawn={index > 0 ? (results[0] ?? null) : null}
                      terms={terms}
                    />
                  </dd>
                </div>
              ))}
              {chances[index] && (
                <div className="col-span-2 grid grid-cols-subgrid items-center border-t border-rule py-1.5">
                  <dt className="text-note text-graphite">Chance of limits</dt>
                  <dd className="text-right">{chances[index]}</dd>
                </div>
              )}
            </dl>
          </li>
        );
      })}
    </ul>
  );
}
