import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { exportPlans } from './bench-export.ts';
import { useArchiveGliders, useCopyGliders } from './bench-queries.ts';
import { useWish } from './use-wish.ts';

interface BenchSelectionProps {
  chosen: readonly GliderSummaryDto[];
  /** what is looked at lies put away */
  archived: boolean;
  /** what was asked for is done: nothing is selected any longer */
  onDone: () => void;
}

/** What can be done with several gliders at once. */
export function BenchSelection({ chosen, archived, onDone }: BenchSelectionProps) {
  const copies = useCopyGliders();
  const archive = useArchiveGliders();
  const [exporting, setExporting] = useState(false);
  const wish = useWish();
  const say = useToast();
  const own = chosen.filter(({ role }) => role === 'owner');
  const busy = copies.isPending || archive.isPending || exporting;
  const ids = (gliders: readonly GliderSummaryDto[]) => gliders.map(({ id }) => id);
  const told = (error: Error) => say(error.message);

  const copy = () =>
    void copies.mutateAsync({ ids: ids(chosen), wish: wish.current() }).then((made) => {
      wish.granted();
      say(`${gliderCount(made.length)} copied.`);
      onDone();
    }, told);
  const putAway = () =>
    void archive.mutateAsync({ ids: ids(own), archived: !archived }).then(() => {
      say(`${gliderCount(own.length)} ${archived ? 'taken back into use' : 'put away'}.`);
      onDone();
    }, told);
  const exportAll = () => {
    setExporting(true);
    exportPlans(chosen)
      .catch(told)
      .finally(() => setExporting(false));
  };

  return (
    <section
      aria-label="Selected gliders"
      className="sticky top-0 z-10 mb-3 flex flex-wrap items-center gap-2 border border-ink bg-ink-wash px-3 py-2"
    >
      <p role="status" className="mr-auto font-semibold">
        {chosen.length === 0 ? 'Tick the gliders.' : `${gliderCount(chosen.length)} selected`}
        {own.length < chosen.length && (
          <span className="block text-note font-normal text-graphite">
            {own.length} of them your own; others’ cannot be archived.
          </span>
        )}
      </p>
      <Button disabled={busy || chosen.length === 0} pending={copies.isPending} onClick={copy}>
        Copy
      </Button>
      <Button disabled={busy || own.length === 0} pending={archive.isPending} onClick={putAway}>
        {archived ? 'Back into use' : 'Archive'}
      </Button>
      <Button disabled={busy || chosen.length === 0} pending={exporting} onClick={exportAll}>
        Export
      </Button>
    </section>
  );
}

function gliderCount(count: number): string {
  return count === 1 ? '1 glider' : `${count} gliders`;
}
