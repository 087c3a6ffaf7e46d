import { useMemo } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Units } from '#shared/format/units.ts';
import type { Kept } from './desk-state.ts';

interface ConflictBannerProps {
  theirs: Kept;
  mine: Estimate;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  onKeepAsNew: () => void;
  pending: boolean;
}

/** Somebody saved in between: both states are at hand, and the reader chooses. */
export function ConflictBanner({
  theirs,
  mine,
  onKeepMine,
  onTakeTheirs,
  onKeepAsNew,
  pending,
}: ConflictBannerProps) {
  const units = useUnits();
  const other = useMemo(() => estimate(theirs.plan), [theirs]);
  return (
    <Notice
      tone="ochre"
      live
      word="Changed meanwhile."
      className="mb-3"
      actions={
        <>
          <Button onClick={onKeepMine}>Keep mine over theirs</Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
          <Button onClick={onKeepAsNew} pending={pending}>
            Keep mine as a new glider
          </Button>
        </>
      }
    >
      {theirs.updatedBy} changed this glider at {formatMoment(theirs.updatedAt)}, while you had edits of your
      own. Theirs: {figures(other, units)}. Yours: {figures(mine, units)}. Until you choose, nothing is
      overwritten; taking theirs can be undone.
    </Notice>
  );
}

function figures(result: Estimate, units: Units): string {
  const mass = units.format(result.totals.mass, 'mass');
  const { percentMac } = result.balance;
  return percentMac === null ? mass : `${mass}, ${units.format(percentMac, 'percentMac')} MAC`;
}
