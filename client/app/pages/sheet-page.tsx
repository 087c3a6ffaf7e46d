import { useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { RequireSession } from '#client/features/session/require-session.tsx';
import { SheetView } from '#client/features/sheets/sheet-view.tsx';

export function SheetPage() {
  const { sheetId = '' } = useParams();
  return (
    <RequireSession signInHref={paths.signIn}>
      <SheetView sheetId={sheetId} gliderHref={(gliderId) => paths.glider(gliderId, 'sheets')} />
    </RequireSession>
  );
}
