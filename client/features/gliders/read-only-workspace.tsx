import { useMemo, useState, type ReactNode } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Plan } from '#shared/core/plan.ts';
import { WorkspaceContext } from './workspace-context.ts';

interface ReadOnlyWorkspaceProviderProps {
  plan: Plan;
  savedAt: string;
  children: ReactNode;
}

const nothing = () => undefined;
const NO_ISSUES: ReadonlyMap<string, string> = new Map();

/** Lays a plan under glass: everything can be looked at and picked, nothing changed. */
export function ReadOnlyWorkspaceProvider({ plan, savedAt, children }: ReadOnlyWorkspaceProviderProps) {
  const [selected, select] = useState<string | null>(null);
  const result = useMemo(() => estimate(plan), [plan]);
  const workspace = useMemo(
    (): Workspace => ({
      plan,
      result,
      edit: nothing,
      canEdit: false,
      kind: 'saved',
      saveState: 'saved',
      savedAt,
      issues: NO_ISSUES,
      selected,
      select,
      undo: nothing,
      redo: nothing,
      canUndo: false,
      canRedo: false,
    }),
    [plan, result, savedAt, selected],
  );
  return <WorkspaceContext value={workspace}>{children}</WorkspaceContext>;
}
