import { AsBuiltPlace } from '#client/features/as-built/as-built-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { useUser } from '#client/features/session/queries.ts';

export function BuiltPage() {
  const workspace = useWorkspace();
  const user = useUser();
  return user ? <AsBuiltPlace workspace={workspace} person={user.id} /> : null;
}
