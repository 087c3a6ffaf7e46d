import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Trial, TrialResult, TrialTerms } from '#shared/core/wood-trial.ts';
import { refusalText, underOf, type COLUMNS } from './columns.ts';

interface TrialFigureProps {
  column: (typeof COLUMNS)[number];
  trial: Trial;
  result: TrialResult;
  /** as drawn, to tell the difference to; null for itself */
  drawn: TrialResult | null;
  terms: TrialTerms;
}

/** One figure of a trial, that can be asked, and how far it is from the plan as drawn. */
export function TrialFigureCell({ column, trial, result, drawn, terms }: TrialFigureProps) {
  const units = useUnits();
  const { figure, quantity, fine = false } = column;
  const value = result[figure];
  if (value === null) {
    if (figure !== 'ballast') return <span className="text-graphite">–</span>;
    return (
      <span className="inline-block max-w-44 text-note font-normal whitespace-normal text-red">
        <span aria-hidden="true">▲ </span>
        {refusalText(result.refused, terms.arm, units)}
      </span>
    );
  }
  const base = drawn?.[figure] ?? null;
  const change = base === null ? '' : units.format(value - base, quantity, { bare: true, plus: true, fine });
  const under = underOf(result, figure, units);
  return (
    <>
      <AskWhy question={{ of: 'trial', figure, trial, terms }} name={`${column.label}, ${trial.name}:`}>
        {units.format(value, quantity, { fine })}
      </AskWhy>
      {(change || under) && (
        <span className="block text-label font-normal text-graphite">
          {change}
          {change && under && ' · '}
          {under}
        </span>
      )}
    </>
  );
}
