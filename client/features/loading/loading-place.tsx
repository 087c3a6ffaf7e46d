import type { ReactNode } from 'react';
import { Notice } from '#client/components/ui/notice.tsx';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { AreaTable } from './area-table.tsx';
import { Flight } from './flight.tsx';
import { PlanformTable } from './planform-table.tsx';
import { SparSection } from './spar/spar-section.tsx';

interface LoadingPlaceProps {
  workspace: Workspace;
  drawingHref: string;
  /** stands under the rest, once there is a mass */
  children?: ReactNode;
}

/** How heavily the wing is loaded, how fast that makes it, and what its spar stands. */
export function LoadingPlace({ workspace, drawingHref, children }: LoadingPlaceProps) {
  const plan = useValidPlan(workspace);
  const { result } = workspace;
  if (!plan) {
    return (
      <div className="px-4 py-6 sm:px-7">
        <Notice tone="red" word="Not yet">
          The drawing has to be mended before it has a loading:{' '}
          {workspace.problem ?? 'a field holds no usable number.'}
        </Notice>
      </div>
    );
  }
  const reference = wingReference(plan);
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  if (!reference || !wing || result.totals.mass <= 0) {
    return (
      <div className="px-4 pt-5 pb-8 sm:px-7">
        <h1 className="text-figure font-semibold">No wing loading yet</h1>
        <p className="mt-1 text-graphite">
          {reference
            ? 'Nothing has a mass yet: give the wing its parts on the Drawing.'
            : 'Draw a wing first: its area carries the mass.'}
        </p>
        <div className="mt-6 max-w-2xl">
          <PlanformTable plan={plan} result={result} />
        </div>
      </div>
    );
  }
  const flown = { mass: result.totals.mass, area: reference.area, mac: reference.mac };
  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <Flight workspace={workspace} plan={plan} flown={flown}>
        <AreaTable plan={plan} result={result} />
        <PlanformTable plan={plan} result={result} />
      </Flight>
      <SparSection {...{ workspace, plan, wing, drawingHref }} />
      {children}
    </div>
  );
}
