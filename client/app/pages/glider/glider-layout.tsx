import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { useCrumbs } from '#client/app/crumbs.tsx';
import { paths, PLACES } from '#client/app/paths.ts';
import { fetchPlaces } from '#client/app/place-routes.tsx';
import { QueryView } from '#client/components/query-view.tsx';
import { buttonClass } from '#client/components/ui/button.tsx';
import { fetchFieldRecords } from '#client/features/first-flight/queries.ts';
import { DeskNotices } from '#client/features/gliders/desk-notices.tsx';
import { LeaveGuard } from '#client/features/gliders/leave-guard.tsx';
import { gliderQueries } from '#client/features/gliders/queries.ts';
import { useKeeper, useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { WorkspaceProvider } from '#client/features/gliders/workspace.tsx';
import { sessionQuery, useUser } from '#client/features/session/queries.ts';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { GliderFrame } from './glider-frame.tsx';

export function GliderLayout() {
  const { id = '' } = useParams();
  return (
    <RequireSession signInHref={paths.signIn}>
      <StoredGlider key={id} id={id} />
    </RequireSession>
  );
}

function StoredGlider({ id }: { id: string }) {
  const query = useQuery(gliderQueries.detail(id));
  const user = useUser();
  const otherwise = (
    <Link to={paths.bench} className="link">
      Back to the bench
    </Link>
  );
  if (!user) return null;
  return (
    <QueryView query={query} otherwise={otherwise}>
      {(glider) => (
        <WorkspaceProvider glider={glider} userId={user.id}>
          <Desk id={id} userName={user.name} />
        </WorkspaceProvider>
      )}
    </QueryView>
  );
}

function Desk({ id, userName }: { id: string; userName: string }) {
  const workspace = useWorkspace();
  const keeper = useKeeper();
  const navigate = useNavigate();
  const client = useQueryClient();
  useTitle(workspace.plan.name);
  useEffect(() => fetchPlaces(PLACES), []);
  useEffect(() => fetchFieldRecords(client, id), [client, id]);
  useCrumbs([{ label: 'Bench', href: paths.bench }, { label: workspace.plan.name }]);
  const hrefOf = (place: (typeof PLACES)[number]) => paths.glider(id, place);
  const within = (pathname: string) => PLACES.some((place) => hrefOf(place) === pathname);
  return (
    <>
      <LeaveGuard workspace={workspace} within={within} />
      <GliderFrame
        places={PLACES}
        hrefOf={hrefOf}
        aside={
          <Link to={paths.sharing(id)} className={buttonClass('plain', 'text-note max-sm:hidden')}>
            {workspace.glider?.can.share ? 'Share' : 'Members'}
          </Link>
        }
        notices={
          keeper.kind === 'saved' && (
            <DeskNotices
              workspace={workspace}
              saver={keeper.saver}
              userName={userName}
              onOpen={(gliderId) => void navigate(paths.glider(gliderId))}
              onSignIn={() => client.setQueryData(sessionQuery.queryKey, { user: null })}
            />
          )
        }
      />
    </>
  );
}
