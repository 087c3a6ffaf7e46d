import { useResolvedPath } from 'react-router-dom';
import { LoadingPlace } from '#client/features/loading/loading-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { useUser } from '#client/features/session/queries.ts';
import { WeatherSection } from '#client/features/weather/weather-section.tsx';

export function LoadingPage() {
  const workspace = useWorkspace();
  const user = useUser();
  const drawing = useResolvedPath('../drawing');
  return (
    <LoadingPlace workspace={workspace} drawingHref={drawing.pathname}>
      <WeatherSection workspace={workspace} person={user?.id ?? 'visitor'} />
    </LoadingPlace>
  );
}
