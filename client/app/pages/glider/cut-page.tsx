import { CutPlace } from '#client/features/cut/cut-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { useUser } from '#client/features/session/queries.ts';

export function CutPage() {
  const workspace = useWorkspace();
  const user = useUser();
  return <CutPlace workspace={workspace} person={user?.id ?? 'visitor'} />;
}
