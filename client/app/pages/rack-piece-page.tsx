import { useNavigate, useParams } from 'react-router-dom';
import { PieceView } from '#client/features/rack/piece-view.tsx';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { paths } from '../paths.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function RackPiecePage() {
  const { id = '' } = useParams();
  const navigate = useNavigate();
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <PieceView
          id={id}
          rackHref={paths.rack}
          pieceHref={paths.rackPiece}
          labelsHref={paths.rackLabels}
          gliderHref={(gliderId) => paths.glider(gliderId)}
          onDeleted={() => void navigate(paths.rack, { replace: true })}
        />
      </SheetPaper>
    </RequireSession>
  );
}
