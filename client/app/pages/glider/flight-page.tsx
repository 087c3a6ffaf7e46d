import { FirstFlightPlace } from '#client/features/first-flight/first-flight-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { useUser } from '#client/features/session/queries.ts';

export function FlightPage() {
  const workspace = useWorkspace();
  const user = useUser();
  return user ? <FirstFlightPlace workspace={workspace} person={user.id} /> : null;
}
