import { DrawingPlace } from '#client/features/drawing/drawing-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';

export function DrawingPage() {
  return <DrawingPlace workspace={useWorkspace()} />;
}
