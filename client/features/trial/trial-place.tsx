import { lazy, Suspense, useDeferredValue, useMemo, useState } from 'react';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useMaterialTable } from '#client/hooks/use-material-table.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { noseOf } from '#shared/core/extent.ts';
import type { Plan } from '#shared/core/plan.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import { runTrials, type Trial } from '#shared/core/wood-trial.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { DrawsSection } from './draws/draws-section.tsx';
import { useDrawSettings } from './draws/settings.ts';
import { trimmedPlan } from './draws/trimmed-plan.ts';
import { trialHeadline } from './headline.ts';
import { useTrials } from './trial-store.ts';
import { TrialTable } from './trial-table.tsx';
import { drawnGroups, firstTrials, woodsOf } from './woods.ts';

const TrialChart = lazy(async () => ({ default: (await import('./trial-chart.tsx')).TrialChart }));
/** Side by side on one sheet. */
const MOST_TRIALS = 4;

/** Grades of wood side by side at the same balance point. */
export function TrialPlace({ workspace }: { workspace: Workspace }) {
  const plan = useValidPlan(workspace);
  if (!plan) {
    return (
      <div className="px-4 py-6 sm:px-7">
        <Notice tone="red" word="Not yet">
          The drawing has to be mended before wood can be tried:{' '}
          {workspace.problem ?? 'a field holds no usable number.'}
        </Notice>
      </div>
    );
  }
  return <Trials workspace={workspace} plan={plan} />;
}

function Trials({ workspace, plan }: { workspace: Workspace; plan: Plan }) {
  const { result, edit, canEdit, kind, glider } = workspace;
  const table = useMaterialTable(kind);
  const [kept, keep] = useTrials(glider?.id ?? 'sample');
  const [chosenArm, setChosenArm] = useState<number | null>(null);
  const say = useToast();
  const units = useUnits();

  const woods = woodsOf(plan, table);
  const groups = drawnGroups(plan, result);
  const trials = useMemo(
    () => kept ?? firstTrials(drawnGroups(plan, result), woodsOf(plan, table)),
    [kept, plan, result, table],
  );
  const arm = chosenArm ?? usualArm(plan);
  const asked = useDeferredValue(trials);
  const tried = useMemo(() => [{ name: 'As drawn', materials: {} }, ...asked], [asked]);
  const run = useMemo(() => runTrials(plan, tried, { arm }), [plan, tried, arm]);
  const [drawSettings, keepDrawSettings] = useDrawSettings(glider?.id ?? 'sample');
  const models = useMemo(
    () => [
      { name: 'As drawn', plan },
      ...asked.flatMap((trial, i) => {
        const mass = run.results[i + 1]?.ballast ?? null;
        return mass === null
          ? []
          : [{ name: trial.name, plan: trimmedPlan(plan, trial, [{ mass, x: arm }]) }];
      }),
    ],
    [plan, asked, run, arm],
  );
  const { headline, detail } = trialHeadline(run, units);

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

  const change = (index: number, trial: Trial) => keep(trials.map((one, i) => (i === index ? trial : one)));
  const use = (trial: Trial) => {
    // Kept as they are, or the first ones would be thought out anew from the changed plan.
    keep([...trials]);
    edit((p) => withWood(p, trial.materials), `wood: ${trial.name}`);
    say(`The plan is now of the wood of “${trial.name}”. Its ballast is left as it was.`);
  };

  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <header>
        <h1 className="text-figure font-semibold">{headline}</h1>
        <p className="mt-1 max-w-4xl text-graphite">
          {detail && <span className="mr-1.5 font-semibold text-pencil">{detail}</span>}
          {termsOf(plan, run.takenOff, run.wanted, arm, units)}
        </p>
      </header>
      <div className="mt-4 max-w-xs">
        <NumberField
          label="Ballast at arm"
          quantity="length"
          inline
          keepRoom
          value={arm}
          min={LIMITS.coordinateMm.min}
          max={LIMITS.coordinateMm.max}
          onChange={(value) => value !== null && setChosenArm(value)}
        />
      </div>
      <TrialTable
        plan={plan}
        groups={groups}
        woods={woods}
        trials={trials}
        tried={tried}
        results={run.results}
        arm={arm}
        onChange={change}
        onRemove={(index) => keep(trials.filter((_, i) => i !== index))}
        onUse={use}
        canEdit={canEdit}
      />
      <div className="mt-3 flex flex-wrap items-center gap-3 print:hidden">
        {trials.length < MOST_TRIALS && (
          <Button onClick={() => keep([...trials, { name: `Trial ${trials.length + 1}`, materials: {} }])}>
            Add a trial
          </Button>
        )}
        <p className="max-w-2xl text-note text-graphite">
          Lighter wood is weaker in proportion: this page weighs, it does not say what a spar will bear.
          Trials are kept in this browser.
        </p>
      </div>
      <div className="mt-9 max-w-4xl">
        <SectionBoundary>
          <Suspense fallback={<Skeleton lines={4} />}>
            <TrialChart results={run.results} />
          </Suspense>
        </SectionBoundary>
      </div>
      <DrawsSection models={models} settings={drawSettings} onSettings={keepDrawSettings} />
    </div>
  );
}

/** Where the plan's foremost ballast lies, or else the nose. */
function usualArm(plan: Plan): number {
  const arms = plan.items.filter(isBallast).map(({ at }) => at[0]);
  return arms.length > 0 ? Math.min(...arms) : (noseOf(plan)?.[0] ?? 0);
}

function termsOf(
  { target }: Plan,
  takenOff: number,
  wanted: number | null,
  arm: number,
  units: Units,
): string {
  const point = target
    ? `the wanted ${formatNumber(target.percentMac, 1)}${NARROW_SPACE}% MAC`
    : `the plan’s own balance point${wanted === null ? '' : `, ${units.format(wanted, 'length')}`}`;
  const off =
    takenOff > 0
      ? ` The plan’s own ballast, ${units.format(takenOff, 'mass')}, is taken off first, also what a class minimum may ask for.`
      : '';
  return `Every column is trimmed by ballast at ${units.format(arm, 'length')} to ${point}.${off}`;
}
