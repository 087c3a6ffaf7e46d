import { Rack } from '#client/features/rack/rack.tsx';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { paths } from '../paths.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function RackPage() {
  useTitle('Rack');
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <Rack
          pieceHref={paths.rackPiece}
          labelsHref={paths.rackLabels}
          gliderHref={(id) => paths.glider(id)}
        />
      </SheetPaper>
    </RequireSession>
  );
}
