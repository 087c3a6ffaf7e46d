import { ChangeText } from '#client/components/change-text.tsx';
import { effectInWords } from '#client/lib/effect-words.ts';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { SaveGroup } from './saves/save-groups.ts';

interface HeadlineProps {
  groups: readonly SaveGroup[];
  materials: Plan['materials'];
}

/** Things of the last change that are told here; the row below has all of them. */
const MOST = 4;

/** What was changed last, by whom, and what it did. */
export function Headline({ groups, materials }: HeadlineProps) {
  const units = useUnits();
  const [last] = groups;
  if (!last) return <h1 className="text-figure font-semibold">Nothing was saved yet</h1>;
  const [newest] = last.saves;
  const { changes } = last;
  if (changes === null) {
    return (
      <header>
        <h1 className="text-figure font-semibold">
          {newest.version === 1 ? 'As it was made' : 'Last saved'}, {formatMoment(newest.savedAt)}
        </h1>
        <p className="mt-1 text-graphite">
          By {newest.savedBy}. Every edit from here on is listed with who made it, when, and what it did to
          mass and balance.
        </p>
      </header>
    );
  }
  return (
    <header>
      <h1 className="text-figure font-semibold">Last change: {effectInWords(changes, units)}</h1>
      <p className="mt-1 text-graphite">
        <ChangeText changes={changes.list} more={changes.more} materials={materials} most={MOST} />. Saved by{' '}
        {newest.savedBy}, {formatMoment(newest.savedAt)}.
      </p>
    </header>
  );
}
