import { useNavigate, useRouteError } from 'react-router-dom';
import { fetchFailed } from '#client/app/fetch-failed.ts';
import { ErrorScreen } from '#client/components/error-screen.tsx';
import { NetworkError } from '#client/lib/api.ts';

/** A place that could not be fetched or shown; the plan on the desk and the other places are as they were. */
export function PlaceError() {
  const error = useRouteError();
  const navigate = useNavigate();
  const told = fetchFailed(error) ? new NetworkError(error) : error;
  return (
    <div className="px-4 py-2 sm:px-7">
      <ErrorScreen error={told} onRetry={() => void navigate('.', { replace: true })} />
    </div>
  );
}
