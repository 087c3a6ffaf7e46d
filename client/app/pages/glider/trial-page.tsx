import { TrialPlace } from '#client/features/trial/trial-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';

export function TrialPage() {
  return <TrialPlace workspace={useWorkspace()} />;
}
