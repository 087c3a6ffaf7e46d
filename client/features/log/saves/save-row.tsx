import type { ReactNode } from 'react';
import { ChangeText } from '#client/components/change-text.tsx';
import { effectInWords } from '#client/lib/effect-words.ts';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderSaveDto, SaveChanges } from '#shared/schemas/glider-save.ts';
import { SaveMenu, type SaveActions } from './save-menu.tsx';

interface SaveRowProps {
  save: GliderSaveDto;
  /** oldest of the saves that the row tells of: the save itself, or the first of its group */
  first: GliderSaveDto;
  changes: SaveChanges | null;
  newest: boolean;
  /** moment of another saved state, by its version */
  momentOf: (version: number) => string | null;
  materials: Plan['materials'];
  actions: SaveActions;
  /** opens the single saves of a group */
  opener?: ReactNode;
}

/** One state: when and who, what changed, what it came to. */
export function SaveRow(props: SaveRowProps) {
  const { save, first, changes, newest, momentOf, materials, actions, opener } = props;
  const units = useUnits();
  const { mass, percentMac } = save.figures;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 gap-y-1 border-b border-rule py-2.5 sm:grid-cols-[8.5rem_minmax(0,1fr)_6.5rem_auto]">
      <div className="max-sm:col-start-1 max-sm:row-start-1">
        <div className="font-semibold">
          {formatMoment(save.savedAt)}
          {newest && <span className="ml-2 text-note font-normal text-graphite">now</span>}
        </div>
        <div className="text-note text-graphite">{save.savedBy}</div>
        {opener}
      </div>
      <div className="min-w-0 max-sm:col-span-2">
        {save.name !== null && (
          <p className="mb-0.5">
            <span className="inline-block border border-strong-rule px-1.5 font-semibold">{save.name}</span>
          </p>
        )}
        {save.restoredFrom !== null && (
          <p className="font-semibold">
            Brought back: the state of {momentOf(save.restoredFrom) ?? `save ${save.restoredFrom}`}
          </p>
        )}
        <p>
          <Told save={save} changes={changes} materials={materials} />
        </p>
        {changes && <p className="text-note text-graphite">{effectInWords(changes, units)}</p>}
      </div>
      <div className="text-right max-sm:col-span-2 max-sm:flex max-sm:gap-3 max-sm:text-note max-sm:text-graphite">
        <div className="whitespace-nowrap">{units.format(mass, 'mass')}</div>
        <div className="whitespace-nowrap sm:text-note sm:text-graphite">
          {percentMac === null ? 'no balance' : `${units.format(percentMac, 'percentMac')} MAC`}
        </div>
      </div>
      <div className="max-sm:col-start-2 max-sm:row-start-1">
        <SaveMenu save={save} first={first} newest={newest} {...actions} />
      </div>
    </div>
  );
}

interface ToldProps extends Pick<SaveRowProps, 'save' | 'changes' | 'materials'> {}

function Told({ save, changes, materials }: ToldProps) {
  if (changes === null) {
    return (
      <span className="text-graphite">
        {save.version === 1 ? 'Made' : 'Saved; what changed was not kept'}
      </span>
    );
  }
  if (changes.list.length === 0) return <span className="text-graphite">Changed and changed back</span>;
  return <ChangeText changes={changes.list} more={changes.more} materials={materials} most={MOST} />;
}

/** Things told in one row. */
const MOST = 6;
