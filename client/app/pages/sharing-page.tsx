import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { useCrumbs } from '#client/app/crumbs.tsx';
import { paths } from '#client/app/paths.ts';
import { QueryView } from '#client/components/query-view.tsx';
import { gliderQueries } from '#client/features/gliders/queries.ts';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { SharingPlace } from '#client/features/sharing/sharing-place.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function SharingPage() {
  const { id = '' } = useParams();
  const query = useQuery(gliderQueries.detail(id));
  const otherwise = (
    <Link to={paths.bench} className="link">
      Back to the bench
    </Link>
  );
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <QueryView query={query} otherwise={otherwise}>
          {(glider) => <Sharing glider={glider} />}
        </QueryView>
      </SheetPaper>
    </RequireSession>
  );
}

function Sharing({ glider }: { glider: GliderDto }) {
  const navigate = useNavigate();
  useTitle(`${glider.name}, sharing`);
  useCrumbs([
    { label: 'Bench', href: paths.bench },
    { label: glider.name, href: paths.glider(glider.id) },
    { label: 'Sharing' },
  ]);
  return (
    <SharingPlace
      glider={glider}
      accountHref={paths.account}
      onLeft={() => void navigate(paths.bench, { replace: true })}
    />
  );
}
