import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { saveStateOf } from './autosave.ts';
import { Autosaver } from './autosaver.ts';
import { draftShelf } from './drafts.ts';
import { putGlider } from './mutations.ts';
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
  const [saver] = useState(
    () =>
      new Autosaver({
        kept: glider,
        shelf: draftShelf(glider.id, userId),
        send: (plan, version) => putGlider(glider.id, plan, version),
        onSaved: () => void client.invalidateQueries({ queryKey: ['gliders', 'list'] }),
      }),
  );
  useEffect(() => saver.start(), [saver]);
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

/** Lays the sample on the desk: the same, but nothing leaves this browser. */
export function SampleWorkspaceProvider({ original, children }: { original: Plan; children: ReactNode }) {
  const [sample] = useState(() => new SampleDesk(original));
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
