import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';
import { fetchFailed } from '#client/app/fetch-failed.ts';
import { paths } from '#client/app/paths.ts';
import { ErrorScreen } from '#client/components/error-screen.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { NetworkError } from '#client/lib/api.ts';
import { NotFoundPage } from './not-found-page.tsx';

/** What is shown where a page itself fails, or its file cannot be fetched. */
export function ErrorPage() {
  const error = useRouteError();
  useTitle('Something went wrong');
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  return (
    <div className="px-4 py-6">
      <ErrorScreen
        error={fetchFailed(error) ? new NetworkError(error) : error}
        onRetry={() => location.reload()}
      >
        <Link to={paths.home} className="link">
          To the start
        </Link>
      </ErrorScreen>
    </div>
  );
}
