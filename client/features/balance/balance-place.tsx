import { lazy, Suspense, useMemo, useState } from 'react';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { WhenNear } from '#client/components/when-near.tsx';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { beamOf } from '#shared/core/beam.ts';
import { noseOf, tipOf } from '#shared/core/extent.ts';
import type { Plan } from '#shared/core/plan.ts';
import { printedSheet } from '#shared/core/printed-sheet.ts';
import { sheetGroupKey } from '#shared/core/sheet-groups.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { printingOf } from '#shared/format/printing.ts';
import { BallastSolver } from './ballast-solver.tsx';
import { BeamView } from './beam-view.tsx';
import { Facts } from './facts.tsx';
import { Headline } from './headline.tsx';
import { SheetTable } from './sheet-table.tsx';
import { TipWeight } from './tip-weight.tsx';
import { verdictOf } from './verdict.ts';
import { WantedFields } from './wanted-fields.tsx';

const Charts = lazy(async () => ({ default: (await import('./charts.tsx')).Charts }));

/** Where the model balances and what puts it right. */
export function BalancePlace({ workspace }: { workspace: Workspace }) {
  const plan = useValidPlan(workspace);
  if (!plan) {
    return (
      <div className="px-4 py-6 sm:px-7">
        <Notice tone="red" word="Not yet">
          The drawing has to be mended before it balances:{' '}
          {workspace.problem ?? 'a field holds no usable number.'}
        </Notice>
      </div>
    );
  }
  return <Balance workspace={workspace} plan={plan} />;
}

function Balance({ workspace, plan }: { workspace: Workspace; plan: Plan }) {
  const { result, selected, select } = workspace;
  const units = useUnits();
  const [open, setOpen] = useState<ReadonlySet<string>>(new Set());
  const [lit, setLit] = useState<string | null>(null);

  // Kept while only the light moves over the sheet.
  const beam = useMemo(() => beamOf(result, wingReference(plan), plan.target), [result, plan]);
  const sheet = useMemo(() => printedSheet(result, printingOf(units)), [result, units]);
  const nose = noseOf(plan) ?? [0, 0, 0];
  const tip = tipOf(plan);
  const verdict = verdictOf(plan, result, beam, nose[0], units);
  const pickedLine = result.lines.find(({ id }) => id === selected);
  const pickedGroup = pickedLine ? sheetGroupKey(pickedLine) : null;
  const shown = pickedGroup === null ? open : new Set([...open, pickedGroup]);

  const toggle = (key: string) => {
    const next = new Set(shown);
    if (!next.delete(key)) next.add(key);
    setOpen(next);
    if (pickedGroup === key && shown.has(key)) select(null);
  };

  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <Headline verdict={verdict} />
      {beam && (
        <div className="mt-3">
          <BeamView
            beam={beam}
            plan={plan}
            lines={result.lines}
            lit={lit}
            onLight={setLit}
            picked={pickedGroup}
            onOpen={(key) => setOpen(new Set([...shown, key]))}
            outside={verdict.kind === 'outside'}
          />
        </div>
      )}
      <div className="mt-6 grid grid-cols-1 items-start gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
        <div className="grid grid-cols-1 gap-y-7">
          <section aria-label="Balance sheet">
            <div className="flex items-baseline justify-between gap-4">
              <h2 className="caption">Balance sheet</h2>
              <p className="text-note text-graphite print:hidden">Press a figure to ask how it was made.</p>
            </div>
            <SheetTable
              plan={plan}
              sheet={sheet}
              open={shown}
              onToggle={toggle}
              lit={lit}
              selected={selected}
              onSelect={select}
            />
          </section>
          {beam && <Facts result={result} beam={beam} />}
        </div>
        {beam && (
          <div className="grid grid-cols-1 gap-y-7 print:hidden">
            <BallastSolver workspace={workspace} beam={beam} nose={nose} />
            {tip && result.totals.at && <TipWeight workspace={workspace} at={result.totals.at} tip={tip} />}
            <WantedFields workspace={workspace} beam={beam} />
          </div>
        )}
      </div>
      {beam && (
        <div className="mt-10 print:hidden">
          <SectionBoundary>
            <WhenNear before={<Skeleton lines={5} />}>
              <Suspense fallback={<Skeleton lines={5} />}>
                <Charts plan={plan} result={result} beam={beam} lit={lit} />
              </Suspense>
            </WhenNear>
          </SectionBoundary>
        </div>
      )}
    </div>
  );
}
