import { createContext, useContext } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Autosaver } from './autosaver.ts';
import type { SampleDesk } from './sample-desk.ts';

/** What stands behind the open glider. */
export type DeskKeeper = { kind: 'saved'; saver: Autosaver } | { kind: 'sample'; sample: SampleDesk };

export const WorkspaceContext = createContext<Workspace | null>(null);
export const KeeperContext = createContext<DeskKeeper | null>(null);

/** The open glider. */
export function useWorkspace(): Workspace {
  const workspace = useContext(WorkspaceContext);
  if (!workspace) throw new Error('There is no open glider here.');
  return workspace;
}

export function useKeeper(): DeskKeeper {
  const keeper = useContext(KeeperContext);
  if (!keeper) throw new Error('There is no open glider here.');
  return keeper;
}
