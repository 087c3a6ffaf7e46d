import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { IN_SIGHT } from './desk-news.tsx';
import type { Kept } from './desk-state.ts';

interface ConflictBannerProps {
  theirs: Kept;
  userName: string;
  /** lines to choose */
  count: number;
  onOpen: () => void;
}

/** Somebody saved in between: said over the sheet as long as it is not settled. */
export function ConflictBanner({ theirs, userName, count, onOpen }: ConflictBannerProps) {
  const who = theirs.updatedBy === userName ? 'Your other window' : theirs.updatedBy;
  return (
    <Notice
      tone="ochre"
      live
      word="Not saved."
      className={IN_SIGHT}
      actions={<Button onClick={onOpen}>Choose …</Button>}
    >
      {who} changed the same {count === 1 ? 'field' : `in ${count} places`} at{' '}
      {formatMoment(theirs.updatedAt)}. You can go on drawing; your edits are kept on this device until you
      choose.
    </Notice>
  );
}
