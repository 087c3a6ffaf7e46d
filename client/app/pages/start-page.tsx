import { Link, useNavigate } from 'react-router-dom';
import { useCrumbs } from '#client/app/crumbs.tsx';
import { paths } from '#client/app/paths.ts';
import { buttonClass } from '#client/components/ui/button.tsx';
import { OtherStarts, useNewGlider } from '#client/features/gliders/new-glider.tsx';
import { useUser } from '#client/features/session/queries.ts';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { StartPlace } from '#client/features/start/start-place.tsx';
import { useMaterialTable } from '#client/hooks/use-material-table.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function StartPage() {
  useTitle('New glider');
  useCrumbs([{ label: 'Bench', href: paths.bench }, { label: 'New glider' }]);
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <Start />
      </SheetPaper>
    </RequireSession>
  );
}

function Start() {
  const navigate = useNavigate();
  const user = useUser();
  const table = useMaterialTable('saved');
  const open = (id: string) => void navigate(paths.glider(id));
  const { pending, begin } = useNewGlider(open);
  return (
    <StartPlace
      person={user?.id ?? 'visitor'}
      table={table}
      pending={pending}
      onDraw={begin}
      others={
        <>
          <OtherStarts onOpen={open} />
          <Link to={paths.bench} className={buttonClass('plain')}>
            Copy one from the bench
          </Link>
        </>
      }
    />
  );
}
