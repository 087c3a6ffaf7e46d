import { useSearchParams } from 'react-router-dom';
import { Labels } from '#client/features/rack/labels.tsx';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { paths } from '../paths.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function RackLabelsPage() {
  useTitle('Labels');
  const [params] = useSearchParams();
  const ids = [...new Set((params.get('pieces') ?? '').split(',').filter(Boolean))];
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetPaper>
        <Labels ids={ids} pieceHref={paths.rackPiece} rackHref={paths.rack} />
      </SheetPaper>
    </RequireSession>
  );
}
