import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { QueryView } from '#client/components/query-view.tsx';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderTrialsDto } from '#shared/schemas/trials.ts';
import { listOf } from './trial-desk.ts';
import { TrialKeeper } from './trial-keeper.ts';
import { draftShelf, sendTrials, trialsQuery } from './trial-queries.ts';
import { TrialSheet } from './trial-sheet.tsx';
import { TrialStatus } from './trial-status.tsx';

interface KeptTrialsProps {
  workspace: Workspace;
  plan: Plan;
  /** id */
  glider: string;
}

/** The trials that the server keeps with a glider: changed by who may edit it, seen by who may read it. */
export function KeptTrials(props: KeptTrialsProps) {
  const query = useQuery(trialsQuery(props.glider));
  return (
    <QueryView query={query}>
      {(kept) =>
        props.workspace.canEdit ? (
          <EditedTrials {...props} kept={kept} />
        ) : (
          <ReadTrials {...props} kept={kept} />
        )
      }
    </QueryView>
  );
}

function ReadTrials({ workspace, plan, kept }: KeptTrialsProps & { kept: GliderTrialsDto }) {
  return (
    <TrialSheet
      workspace={workspace}
      plan={plan}
      list={listOf(kept)}
      untouched={false}
      status={
        <p className="text-note text-graphite">
          You may look at these trials; the owner and builders of this glider change them.
        </p>
      }
    />
  );
}

function EditedTrials({ workspace, plan, glider, kept }: KeptTrialsProps & { kept: GliderTrialsDto }) {
  const client = useQueryClient();
  const [keeper] = useState(
    () =>
      new TrialKeeper({
        kept,
        draft: draftShelf(glider),
        send: (list, version) => sendTrials(glider, list, version),
        onSaved: (saved) => client.setQueryData(trialsQuery(glider).queryKey, saved),
      }),
  );
  const desk = useSyncExternalStore(keeper.subscribe, keeper.getDesk);
  useEffect(() => keeper.start(), [keeper]);
  useEffect(() => keeper.refreshed(kept), [keeper, kept]);
  return (
    <TrialSheet
      workspace={workspace}
      plan={plan}
      list={desk.list}
      untouched={desk.base.updatedAt === null && desk.list.trials.length === 0}
      onList={keeper.change}
      status={<TrialStatus desk={desk} onRetry={keeper.retry} onRead={keeper.newsRead} />}
    />
  );
}
