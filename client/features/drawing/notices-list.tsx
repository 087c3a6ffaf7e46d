import { memo, useDeferredValue } from 'react';
import { noticeWords, type NoticeWords } from '#client/components/notice-text.ts';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Notice as CoreNotice } from '#shared/core/notices.ts';
import type { Plan } from '#shared/core/plan.ts';
import { Fold } from './fold.tsx';

interface NoticesListProps {
  notices: readonly CoreNotice[];
  plan: Plan;
  onPick: (line: string) => void;
}

/** More than this is folded away. */
const AT_ONCE = 3;

/** What the calculator has to say of the plan: what is out of its limits first, each with a way to the part. */
export function NoticesList({ notices, plan, onPick }: NoticesListProps) {
  // Many words, and none that anybody waits for: they come behind the figures.
  return <Told notices={useDeferredValue(notices)} plan={useDeferredValue(plan)} onPick={onPick} />;
}

const Told = memo(function Told({ notices, plan, onPick }: NoticesListProps) {
  const units = useUnits();
  const all = notices.map((notice) => noticeWords(notice, plan, units));
  const words = [...all.filter(({ tone }) => tone === 'red'), ...all.filter(({ tone }) => tone !== 'red')];
  if (words.length === 0) return null;
  const rest = words.slice(AT_ONCE);
  return (
    <section aria-label="Notices" className="grid gap-y-1.5">
      {words.slice(0, AT_ONCE).map((one, i) => (
        <OneNotice key={i} words={one} onPick={onPick} />
      ))}
      {rest.length > 0 && (
        <Fold summary={rest.length === 1 ? 'One more' : `${rest.length} more`}>
          <div className="grid gap-y-1.5">
            {rest.map((one, i) => (
              <OneNotice key={i} words={one} onPick={onPick} />
            ))}
          </div>
        </Fold>
      )}
    </section>
  );
});

function OneNotice({ words, onPick }: { words: NoticeWords; onPick: (line: string) => void }) {
  const { tone, text, line } = words;
  return (
    <Notice
      tone={tone}
      className="py-1 text-note"
      actions={
        line !== null && (
          <Button variant="plain" className="text-note" onClick={() => onPick(line)}>
            Show the part
          </Button>
        )
      }
    >
      {text}
    </Notice>
  );
}
