import { LoadingPlace } from '#client/features/loading/loading-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';

export function LoadingPage() {
  return <LoadingPlace workspace={useWorkspace()} />;
}
