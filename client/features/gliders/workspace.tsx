import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { Autosaver } from './autosaver.ts';
import { DeskWatch } from './desk-watch.ts';
import { saveStateOf } from './desk-state.ts';
import { draftShelf } from './drafts.ts';
import { trailShelf } from './history-shelf.ts';
import { putGlider } from './mutations.ts';
import { gliderQueries, latestVersion } from './queries.ts';
import { firstIssue } from './plan-check.ts';
import { SampleDesk } from './sample-desk.ts';
import { useDeskPlace } from './use-desk-place.ts';
import { KeeperContext, WorkspaceContext } from './workspace-context.ts';

interface WorkspaceProviderProps {
  glider: GliderDto;
  userId: string;
  children: ReactNode;
}

/** Lays a stored glider on the desk. Give it a `key` per glider. */
export function WorkspaceProvider({ glider, userId, children }: WorkspaceProviderProps) {
  const client = useQueryClient();
  const [{ saver, watch }] = useState(() => standBehind(glider, userId, client));
  useEffect(() => saver.start(), [saver]);
  useEffect(() => watch.start(), [watch]);
  useEffect(() => saver.dispatch({ type: 'refreshed', kept: glider }), [saver, glider]);

  const desk = useSyncExternalStore(saver.subscribe, saver.getDesk);
  const place = useDeskPlace(saver, desk);
  const canEdit = glider.can.edit;
  const workspace = useMemo(
    (): Workspace => ({
      ...place,
      edit: canEdit ? place.edit : () => undefined,
      canEdit,
      kind: 'saved',
      saveState: saveStateOf(desk),
      savedAt: desk.base.updatedAt,
      problem: desk.problem ?? firstIssue(desk.history.present, desk.check.issues) ?? undefined,
      glider,
    }),
    [place, canEdit, desk, glider],
  );
  const keeper = useMemo(() => ({ kind: 'saved' as const, saver }), [saver]);

  return (
    <KeeperContext value={keeper}>
      <WorkspaceContext value={workspace}>{children}</WorkspaceContext>
    </KeeperContext>
  );
}

/** What saves the glider, and what notices that somebody else did. */
function standBehind(glider: GliderDto, userId: string, client: QueryClient) {
  const { id } = glider;
  const saver: Autosaver = new Autosaver({
    kept: glider,
    shelf: draftShelf(id, userId),
    trail: trailShelf(`${userId}.${id}`),
    send: (plan, version) => putGlider(id, plan, version),
    onSaved: () => {
      watch.announce();
      void client.invalidateQueries({ queryKey: ['gliders', 'list'] });
    },
  });
  const watch: DeskWatch = new DeskWatch({
    known: () => saver.getDesk().theirs?.version ?? saver.getDesk().base.version,
    latest: () => latestVersion(id),
    refresh: () => client.fetchQuery({ ...gliderQueries.detail(id), staleTime: 0 }),
    channel: `featherbeam.glider.${id}`,
  });
  return { saver, watch };
}

/** Lays the sample on the desk: the same, but nothing leaves this browser. */
export function SampleWorkspaceProvider({ original, children }: { original: Plan; children: ReactNode }) {
  const [sample] = useState(() => new SampleDesk(original));
  useEffect(() => sample.start(), [sample]);
  const desk = useSyncExternalStore(sample.subscribe, sample.getDesk);
  const place = useDeskPlace(sample, desk);
  const workspace = useMemo(
    (): Workspace => ({
      ...place,
      canEdit: true,
      kind: 'sample',
      saveState: desk.check.ok ? 'saved' : 'invalid',
      problem: firstIssue(desk.history.present, desk.check.issues) ?? undefined,
    }),
    [place, desk],
  );
  const keeper = useMemo(() => ({ kind: 'sample' as const, sample }), [sample]);

  return (
    <KeeperContext value={keeper}>
      <WorkspaceContext value={workspace}>{children}</WorkspaceContext>
    </KeeperContext>
  );
}
