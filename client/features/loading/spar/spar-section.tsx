import { lazy, Suspense, useMemo } from 'react';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { bendOf, nearestToStrength } from '#shared/core/deflection.ts';
import { atLoadFactor, loadFactorAtStrength, worstStation } from '#shared/core/load-cases.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { CaseTable } from './case-table.tsx';
import { caseRows, keptCases, NO_CASES, shownCase, type KeptCases } from './cases.ts';
import { Cautions } from './cautions.tsx';
import { ClosedNoseNote } from './closed-nose.tsx';
import { SparLink } from './spar-link.tsx';
import { loadFactorText, marginText, placeText, sparStanding } from './words.ts';

const MarginChart = lazy(async () => ({ default: (await import('./margin-chart.tsx')).MarginChart }));

interface SparSectionProps {
  workspace: Workspace;
  plan: Plan;
  wing: Surface;
  drawingHref: string;
}

/** What the wing's spar stands: along the span, and by ways of loading it. */
export function SparSection({ workspace, plan, wing, drawingHref }: SparSectionProps) {
  const worst = worstStation(workspace.result.spar);
  return (
    <section aria-labelledby="spar" className="mt-10 border-t border-rule pt-6">
      {worst ? (
        <Reckoned {...{ workspace, plan, wing, drawingHref }} />
      ) : (
        <>
          <h2 id="spar" className="text-heading font-semibold">
            No spar to reckon with yet
          </h2>
          <p className="mt-1 max-w-2xl text-graphite">
            {workspace.result.totals.mass > workspace.result.totals.wingMass
              ? 'Seat a strip at the top or the bottom of the wing, of a wood whose stiffness and strength the materials table knows.'
              : 'The wing has nothing to carry yet: give the model its fuselage, tail and gear.'}
          </p>
        </>
      )}
    </section>
  );
}

function Reckoned({ workspace, plan, wing, drawingHref }: SparSectionProps) {
  const { result, edit, canEdit } = workspace;
  const units = useUnits();
  const [kept, keep] = useKept<KeptCases>(
    `featherbeam.load-cases.${workspace.glider?.id ?? 'sample'}`,
    keptCases,
    NO_CASES,
  );
  const planned = plan.flight?.loadFactor ?? 1;
  const rows = caseRows(kept, planned, result.speeds.stall);
  const shown = shownCase(rows, kept.shown);
  const spar = {
    stations: atLoadFactor(result.spar.stations, planned, shown.loadFactor),
    worst: result.spar.worst,
  };
  const worst = worstStation(spar);
  const atStrength = loadFactorAtStrength(result.spar, planned);
  const carried = result.totals.mass - result.totals.wingMass;
  const bend = useMemo(() => bendOf(plan, wing, carried), [plan, wing, carried]);
  const part = useMemo(
    () => (result.spar.worst === null ? null : nearestToStrength(plan, wing, result.spar.worst)),
    [plan, wing, result.spar.worst],
  );
  if (!worst) return null;
  const standing = sparStanding(worst.margin);
  const rise = bend && bend.tip * shown.loadFactor;
  const name = result.lines.find(({ id }) => id === part)?.name;

  return (
    <>
      <h2 id="spar" className="text-heading font-semibold">
        {standing === 'outside' && (
          <span aria-hidden="true" className="text-red">
            ▲{' '}
          </span>
        )}
        <span className={cn(standing === 'outside' && 'text-red')}>
          Margin {marginText(worst.margin)} {placeText(worst.s, units)} at {loadFactorText(shown.loadFactor)}
        </span>
      </h2>
      <p className="mt-1 max-w-3xl">
        {part && name && (
          <>
            <SparLink workspace={workspace} lineId={part} name={name} href={drawingHref} /> is nearest to its
            strength there.{' '}
          </>
        )}
        As reckoned it reaches its strength at {loadFactorText(atStrength)}
        {rise !== null && (
          <>
            ; at {loadFactorText(shown.loadFactor)} the tip rises {units.format(rise, 'length')}
          </>
        )}
        .
      </p>
      {standing === 'outside' && (
        <Notice tone="red" word="Over its strength." className="mt-3 max-w-3xl">
          A stronger wood, a deeper section or a wider strip at the root helps most.
        </Notice>
      )}
      {standing === 'close' && (
        <Notice tone="ochre" word="Close." className="mt-3 max-w-3xl">
          The strength of one stick may lie a third under the average that this is made from.
        </Notice>
      )}
      <div className="mt-5 grid grid-cols-1 items-start gap-x-12 gap-y-8 lg:grid-cols-2">
        <SectionBoundary>
          <Suspense fallback={<Skeleton lines={5} />}>
            <MarginChart stations={spar.stations} worst={worst} loadFactor={shown.loadFactor} />
          </Suspense>
        </SectionBoundary>
        <div className="grid grid-cols-1 gap-y-5">
          <CaseTable
            rows={rows}
            shown={shown.key}
            onShown={(key) => keep({ ...kept, shown: key })}
            onSpeed={(key, speed) => keep({ ...kept, speeds: { ...kept.speeds, [key]: speed } })}
            stated={workspace.plan.flight?.loadFactor ?? 1}
            onStated={
              canEdit
                ? (loadFactor) => edit((p) => ({ ...p, flight: { ...p.flight, loadFactor } }), 'load factor')
                : null
            }
            marginAt={(n) => (atStrength === null ? null : atStrength / n)}
            worst={worst.s}
            riseAt={(n) => (bend === null ? null : bend.tip * n)}
          />
          <Cautions stall={result.speeds.stall} bend={bend} rise={rise} span={wingSpan(result, wing)} />
          <ClosedNoseNote plan={plan} wing={wing} />
        </div>
      </div>
    </>
  );
}

function wingSpan(result: Workspace['result'], wing: Surface): number {
  return result.planform[wing.key]?.span ?? 0;
}
