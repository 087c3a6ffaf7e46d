import { useMemo, useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { AssignPieces } from './assign-pieces.tsx';
import { AssignTable } from './assign-table.tsx';
import { AssignTermFields } from './assign-terms.tsx';
import { measuredWoods } from './densities.ts';
import { SearchProgress } from './search-progress.tsx';
import { useAssignment, type Assignment } from './use-assignment.ts';
import { useSearch } from './use-search.ts';
import { assignHeadline, gapWords } from './words.ts';

/** Near enough to the best, as a fraction. */
const GAP = 0.01;
const USUAL_SECONDS = 20;

/** Which piece of the rack each part is cut from. */
export function AssignSection({ workspace, plan }: { workspace: Workspace; plan: Plan }) {
  const assignment = useAssignment(workspace, plan);
  return (
    <section
      aria-label="Which piece for which part"
      className="mt-12 border-t border-rule pt-6 print:break-before-page"
    >
      {assignment === null ? (
        <>
          <h2 className="text-heading font-semibold">Which piece for which part</h2>
          <p className="text-graphite">Fetching your rack …</p>
        </>
      ) : (
        <Assigned workspace={workspace} plan={plan} assignment={assignment} />
      )}
    </section>
  );
}

interface AssignedProps {
  workspace: Workspace;
  plan: Plan;
  assignment: Assignment;
}

function Assigned({ workspace, plan, assignment }: AssignedProps) {
  const units = useUnits();
  const [seconds, setSeconds] = useState(USUAL_SECONDS);
  const { problem, choice, pieces, account, isChanged, keep, keeping, revert, take, refusal } = assignment;
  const search = useSearch(take);
  const woods = useMemo(() => measuredWoods(plan, problem, choice, pieces), [plan, problem, choice, pieces]);
  const { canEdit } = workspace;
  const isCut = account.bought.length < problem.parts.length;
  if (problem.stock.length === 0) {
    return (
      <>
        <h2 className="text-heading font-semibold">Which piece for which part</h2>
        <p className="max-w-prose text-graphite">
          Nothing weighed lies on your rack. Put sheets and sticks there with their sizes and masses, and the
          best piece for each part can be found. <Link to={paths.rack}>To the rack</Link>
        </p>
      </>
    );
  }
  const { title, text } = assignHeadline(assignment, plan, units);
  // While and after searching the line under the buttons says it.
  const near = search.state === 'idle' ? gapWords(assignment, units) : '';
  return (
    <>
      <h2 className="text-heading font-semibold">Which piece for which part</h2>
      <p className="mt-1 font-semibold">{title}</p>
      <p className="text-graphite">
        {text} {near}
      </p>
      {canEdit && (
        <div className="mt-4 print:hidden">
          <AssignTermFields assignment={assignment} seconds={seconds} onSeconds={setSeconds} />
          <div className="flex flex-wrap items-center gap-2">
            {search.state === 'working' ? (
              <Button variant="danger" onClick={search.stop}>
                Stop searching
              </Button>
            ) : (
              <Button variant="primary" onClick={() => search.start({ problem, seconds, gap: GAP })}>
                Find the best pieces
              </Button>
            )}
            <Button onClick={keep} disabled={!isChanged} pending={keeping} pendingText="Keeping …">
              Keep and reserve
            </Button>
            <Button variant="plain" onClick={revert} disabled={!isChanged}>
              Back to what is kept
            </Button>
            <Button
              variant="plain"
              disabled={!isCut || account.faults.length > 0}
              onClick={() => workspace.edit((from) => withWood(from, woods), 'measured wood of the pieces')}
            >
              Write their densities into the drawing
            </Button>
          </div>
          <SearchProgress search={search} account={account} />
        </div>
      )}
      {refusal && (
        <Notice tone="red" word="Not kept:" live className="mt-3 max-w-3xl">
          {refusal}
        </Notice>
      )}
      {assignment.isOlder && !isChanged && (
        <Notice tone="ochre" word="Older drawing:" className="mt-3 max-w-3xl">
          the drawing was saved again since this was kept; look it through, and keep it anew.
        </Notice>
      )}
      <AssignPieces assignment={assignment} plan={plan} />
      <AssignTable assignment={assignment} plan={plan} canEdit={canEdit && search.state !== 'working'} />
    </>
  );
}
