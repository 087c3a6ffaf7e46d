import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { useCrumbs } from '#client/app/crumbs.tsx';
import { paths, SHARED_PLACES, type Place } from '#client/app/paths.ts';
import { QueryView } from '#client/components/query-view.tsx';
import { ReadOnlyWorkspaceProvider } from '#client/features/gliders/read-only-workspace.tsx';
import { sharingQueries } from '#client/features/sharing/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { ApiError } from '#client/lib/api.ts';
import { formatMoment } from '#client/lib/moments.ts';
import type { SharedGliderDto } from '#shared/schemas/sharing.ts';
import { SheetPaper } from '../../sheet-paper.tsx';
import { GliderFrame } from './glider-frame.tsx';

/** A glider as a read-only link shows it, without an account. */
export function SharedLayout() {
  const { token = '' } = useParams();
  const query = useQuery(sharingQueries.shared(token));
  if (query.error instanceof ApiError && query.error.status === 404) return <SwitchedOff />;
  return (
    <QueryView query={query}>
      {(shared) => (
        <ReadOnlyWorkspaceProvider plan={shared.plan} savedAt={shared.updatedAt}>
          <Shared token={token} shared={shared} />
        </ReadOnlyWorkspaceProvider>
      )}
    </QueryView>
  );
}

function Shared({ token, shared }: { token: string; shared: SharedGliderDto }) {
  useTitle(`${shared.name}, shared`);
  useCrumbs([{ label: 'Shared' }, { label: shared.name }]);
  const hrefOf = (place: Place) =>
    paths.shared(token, SHARED_PLACES.find((shown) => shown === place) ?? 'drawing');
  return (
    <GliderFrame
      places={SHARED_PLACES}
      hrefOf={hrefOf}
      aside={
        <p className="text-note text-graphite max-sm:mb-1">
          Shared to look at; last changed{' '}
          <time dateTime={shared.updatedAt}>{formatMoment(shared.updatedAt)}</time>.
        </p>
      }
    />
  );
}

function SwitchedOff() {
  useTitle('Link switched off');
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">This link shows nothing</h1>
      <p className="mt-2">Its owner has switched it off, or it was copied only in part.</p>
      <p className="mt-5">
        <Link to={paths.home} className="link">
          To the start
        </Link>
      </p>
    </SheetPaper>
  );
}
