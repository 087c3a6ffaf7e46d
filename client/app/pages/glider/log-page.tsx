import { useKeeper, useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { LogPlace } from '#client/features/log/log-place.tsx';

export function LogPage() {
  const workspace = useWorkspace();
  const keeper = useKeeper();
  // The sample is not stored, so it has no log and no tab for it.
  if (keeper.kind === 'sample' || !workspace.glider) return null;
  return <LogPlace workspace={workspace} glider={workspace.glider} bringBack={keeper.saver.bringBack} />;
}
