import { useMemo, useState } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import { estimate } from '#shared/core/estimate.ts';
import { newMemory } from '#shared/core/laid-surface.ts';
import type { DeskEvent } from './autosave.ts';
import type { Desk } from './desk-state.ts';

interface DeskHolder {
  dispatch: (event: DeskEvent) => void;
}

type DeskPlace = Omit<Workspace, 'canEdit' | 'kind' | 'saveState' | 'savedAt' | 'problem' | 'glider'>;

/** The part of a workspace that a stored glider and the sample share. */
export function useDeskPlace(holder: DeskHolder, desk: Desk): DeskPlace {
  const [selected, select] = useState<string | null>(null);
  const { history, check, valid } = desk;
  const [memory] = useState(newMemory);
  const result = useMemo(() => estimate(valid, memory), [valid, memory]);
  return useMemo(
    () => ({
      plan: history.present,
      result,
      edit: (recipe, what) => holder.dispatch({ type: 'edited', recipe, what, at: Date.now() }),
      issues: check.issues,
      selected,
      select,
      undo: () => holder.dispatch({ type: 'undone' }),
      redo: () => holder.dispatch({ type: 'redone' }),
      canUndo: history.past.length > 0,
      canRedo: history.future.length > 0,
    }),
    [holder, history, check, result, selected],
  );
}
