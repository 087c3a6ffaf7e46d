import { paths } from '#client/app/paths.ts';
import { QueryView } from '#client/components/query-view.tsx';
import { MaterialsBrowser } from '#client/features/materials/materials-browser.tsx';
import { useSession } from '#client/features/session/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function MaterialsPage() {
  useTitle('Materials');
  const session = useSession();
  return (
    <SheetPaper>
      <QueryView query={session}>
        {({ user }) => <MaterialsBrowser role={user?.role ?? null} gliderHref={(id) => paths.glider(id)} />}
      </QueryView>
    </SheetPaper>
  );
}
