import { ChangeText } from '#client/components/change-text.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import type { Plan } from '#shared/core/plan.ts';
import type { News } from './desk-state.ts';

interface DeskNewsProps {
  news: News;
  materials: Plan['materials'];
  userName: string;
  onRead: () => void;
}

/** Stays in sight wherever the page is scrolled to; on the phone over the bar at the bottom. */
export const IN_SIGHT =
  'mb-3 sticky top-0 z-20 max-sm:fixed max-sm:inset-x-2 max-sm:bottom-16 max-sm:top-auto max-sm:mb-0 max-sm:shadow-float print:hidden';

/** Things told before the line says how many more there are. */
const MOST = 3;

/** What somebody else saved and this window took in by itself. */
export function DeskNews({ news, materials, userName, onRead }: DeskNewsProps) {
  return (
    <Notice tone="ink" live className={IN_SIGHT} actions={<Button onClick={onRead}>Seen</Button>}>
      Took in {whoseChanges(news.by, userName)}:{' '}
      <ChangeText changes={news.changes} materials={materials} most={MOST} />.
    </Notice>
  );
}

export function whoseChanges(by: string, userName: string): string {
  return by === userName ? 'the changes of your other window' : `${by}’s changes`;
}
