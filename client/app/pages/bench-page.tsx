import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Bench } from '#client/features/gliders/bench.tsx';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function BenchPage() {
  useTitle('Bench');
  const navigate = useNavigate();
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <Bench
          hrefOf={(id) => paths.glider(id)}
          sharingHrefOf={paths.sharing}
          onGuided={() => void navigate(paths.start)}
          onOpen={(id) => void navigate(paths.glider(id))}
        />
      </SheetPaper>
    </RequireSession>
  );
}
