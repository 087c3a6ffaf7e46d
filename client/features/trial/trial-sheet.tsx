import { useDeferredValue, useMemo, useState, type ReactNode } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useMaterialTable } from '#client/hooks/use-material-table.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { trialBase } from '#shared/core/wood-trial-base.ts';
import { trialsFrom } from '#shared/core/wood-trial.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { TrialDto, TrialsInput } from '#shared/schemas/trials.ts';
import { CompareTable } from './compare-table.tsx';
import { DrawsSection } from './draws/draws-section.tsx';
import { useDrawSettings } from './draws/settings.ts';
import { bestOf, bestTrades } from './headline.ts';
import { SensitivitySection } from './sensitivity-section.tsx';
import { useRackWoods } from './rack-woods.ts';
import { StockSection } from './stock-section.tsx';
import { TermsFields } from './terms-fields.tsx';
import { TradeOffPlot } from './trade-off-plot.tsx';
import { TrialHeadline } from './trial-headline.tsx';
import { freeName } from './trial-join.ts';
import { AirNote } from './air-note.tsx';
import { useTrialChances } from './trial-chances.ts';
import { usualArm } from './usual-arm.ts';
import { WoodChoice } from './wood-choice.tsx';
import { drawnGroups, firstTrials, woodsOf } from './woods.ts';

interface TrialSheetProps {
  workspace: Workspace;
  plan: Plan;
  list: TrialsInput;
  /** nobody has made a trial yet: one is thought out to begin with */
  untouched: boolean;
  /** absent for readers */
  onList?: (list: TrialsInput) => void;
  /** where the trials are kept, and what stands in the way */
  status: ReactNode;
}

const DRAWN: TrialDto = { name: 'As drawn', materials: {} };

/** Everything about the trials of one glider, wherever they are kept. */
export function TrialSheet({ workspace, plan, list, untouched, onList, status }: TrialSheetProps) {
  const { result, edit, kind, glider } = workspace;
  const table = useMaterialTable(kind);
  const say = useToast();
  const [pickedIndex, pick] = useState(1);
  const [pair, setPair] = useState<[number, number] | null>(null);
  const woods = useMemo(() => woodsOf(plan, table), [plan, table]);
  const rack = useRackWoods(kind, woods);
  const groups = useMemo(() => drawnGroups(plan, result), [plan, result]);
  const editable = onList !== undefined;
  const trials = useMemo(
    () => (untouched && editable ? firstTrials(groups, woods) : list.trials),
    [untouched, editable, groups, woods, list.trials],
  );

  // Measured once a plan: another wood then costs one product, and stays within a frame.
  const base = useMemo(() => trialBase(plan), [plan]);
  const arm = list.terms.arm ?? usualArm(plan);
  const terms = useMemo(() => ({ arm, minimumMass: list.terms.minimumMass }), [arm, list.terms.minimumMass]);
  const tried = useMemo(() => [DRAWN, ...trials], [trials]);
  const run = useMemo(() => trialsFrom(base, tried, terms), [base, tried, terms]);
  const shown = useMemo(() => ({ plan, run, terms, tried }), [plan, run, terms, tried]);
  const best = bestTrades(run.results);
  const later = useDeferredValue(shown);
  const [drawSettings, keepDrawSettings] = useDrawSettings(glider?.id ?? 'sample');
  const { models, chances } = useTrialChances(later, drawSettings);

  if (groups.length === 0) {
    return (
      <div className="px-4 pt-5 pb-8 sm:px-7">
        <h1 className="text-figure font-semibold">No wood to choose yet</h1>
        <p className="mt-1 text-graphite">
          Draw ribs, spars or sheeting of wood first; then grades can be compared here.
        </p>
      </div>
    );
  }

  const picked = Math.min(pickedIndex, trials.length);
  const trial = trials[picked - 1];
  const [from, to] = pair && pair.every((i) => i < tried.length) ? pair : [0, bestOf(run.results)];
  const full = trials.length >= LIMITS.trials.max;
  const keep = (next: readonly TrialDto[]) => onList?.({ ...list, trials: [...next] });
  const insert = (at: number, added: TrialDto) => {
    keep([...trials.slice(0, at), added, ...trials.slice(at)]);
    pick(at + 1);
    setPair(null);
  };
  const move = (by: -1 | 1) => {
    const next = [...trials];
    const [one] = next.splice(picked - 1, 1);
    if (one) next.splice(picked - 1 + by, 0, one);
    keep(next);
    pick(picked + by);
    setPair(null);
  };
  const use = (chosen: TrialDto) => {
    // Kept as they are, or the first ones would be thought out anew from the changed plan.
    if (untouched) keep(trials);
    edit((p) => withWood(p, chosen.materials), `wood: ${chosen.name}`);
    say(
      `The plan is now of the wood of “${chosen.name}”. Its ballast is left as it was; undo takes it back.`,
    );
  };

  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <header>
        <TrialHeadline {...{ tried, run, terms, from, to }} onPair={(a, b) => setPair([a, b])} />
      </header>
      <TermsFields
        {...{ plan, run, arm, editable }}
        terms={list.terms}
        onTerms={(next) => onList?.({ trials: [...trials], terms: next })}
      />
      <CompareTable {...{ tried, terms, chances, best, picked }} results={run.results} onPick={pick} />
      <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-2 print:hidden">
        {editable && (
          <Button
            disabled={full}
            onClick={() =>
              insert(trials.length, { name: freeName(`Trial ${trials.length + 1}`, trials), materials: {} })
            }
          >
            Add a trial
          </Button>
        )}
        {status}
      </div>
      {trial && (
        <>
          <WoodChoice
            key={picked}
            {...{ plan, groups, woods, rack, trial, editable, full }}
            number={picked}
            last={picked === trials.length}
            onTrial={(next) => keep(trials.map((one, i) => (i === picked - 1 ? next : one)))}
            onCopy={() => insert(picked, { ...trial, name: freeName(trial.name, trials) })}
            onMove={move}
            onRemove={() => {
              keep(trials.filter((_, i) => i !== picked - 1));
              pick(Math.max(1, picked - 1));
              setPair(null);
            }}
            onUse={() => use(trial)}
          />
          <div className="max-w-4xl">
            <StockSection name={trial.name} plan={plan} trial={trial} />
            <AirNote picked={picked} later={later} />
          </div>
        </>
      )}
      <div className="mt-9 max-w-4xl">
        <TradeOffPlot
          {...{ best, picked }}
          results={run.results}
          onPick={(index) => index > 0 && pick(index)}
        />
        <p className="mt-2 max-w-2xl text-note text-graphite">
          Margins are estimates from the average strength of each wood: grain, knots and glue decide, and no
          figure here is a licence to launch hard.
        </p>
      </div>
      <SensitivitySection base={base} arm={arm} />
      <DrawsSection models={models} settings={drawSettings} onSettings={keepDrawSettings} />
    </div>
  );
}
