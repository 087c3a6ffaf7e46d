import { useNavigate, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { QueryView } from '#client/components/query-view.tsx';
import { useSession } from '#client/features/session/queries.ts';
import { InvitationPlace } from '#client/features/sharing/invitation-place.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function InvitationPage() {
  const { token = '' } = useParams();
  const session = useSession();
  const navigate = useNavigate();
  useTitle('Invitation');
  const here = paths.invitation(token);
  return (
    <SheetPaper narrow>
      <QueryView query={session}>
        {({ user }) => (
          <InvitationPlace
            token={token}
            user={user}
            signInHref={paths.signIn(here)}
            signUpHref={paths.signUp(here)}
            benchHref={paths.bench}
            onAccepted={(id) => void navigate(paths.glider(id), { replace: true })}
          />
        )}
      </QueryView>
    </SheetPaper>
  );
}
