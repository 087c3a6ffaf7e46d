import { useId, type ReactNode, type Ref } from 'react';
import { cn } from '#client/lib/cn.ts';
import { changesInWords, fieldInWords, nameInWords } from '#client/lib/change-words.ts';
import { valueInWords } from '#client/lib/change-values.ts';
import { effectInWords } from '#client/lib/effect-words.ts';
import { useUnits } from '#client/lib/units.ts';
import type { PlanChange } from '#shared/core/field-changes.ts';
import type { MergeChoice, PlanConflict } from '#shared/core/merge-fields.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Units } from '#shared/format/units.ts';
import type { Effect } from './conflict-effects.ts';

interface ConflictRowProps {
  conflict: PlanConflict;
  materials: Plan['materials'];
  /** whose state the other one is: `Ines` */
  other: string;
  effects: ReadonlyMap<MergeChoice, Effect | null> | undefined;
  choice: MergeChoice | undefined;
  onChoice: (choice: MergeChoice) => void;
  missing: boolean;
  firstRef: Ref<HTMLInputElement>;
}

/** One part and field that both sides changed, with both values and what each comes to. */
export function ConflictRow(props: ConflictRowProps) {
  const { conflict, materials, other, effects, choice, onChoice, missing, firstRef } = props;
  const units = useUnits();
  const id = useId();
  const options: { value: MergeChoice; label: string; text: string }[] = [
    { value: 'mine', label: 'Mine', text: sideInWords(conflict, conflict.mine, materials, units) },
    { value: 'theirs', label: other, text: sideInWords(conflict, conflict.theirs, materials, units) },
    ...(conflict.canKeepBoth
      ? [{ value: 'both' as const, label: 'Both', text: 'side by side, mine under a key of its own' }]
      : []),
  ];
  const before = beforeInWords(conflict, materials, units);
  return (
    <div
      role="radiogroup"
      aria-labelledby={`${id}-name`}
      aria-describedby={missing ? `${id}-missing` : undefined}
      className="grid grid-cols-1 gap-x-4 gap-y-1 border-b border-rule py-3 sm:grid-cols-[minmax(0,4fr)_minmax(0,8fr)]"
    >
      <div>
        <div id={`${id}-name`}>
          <span className="font-semibold">{nameInWords(conflict)}</span> {fieldInWords(conflict)}
        </div>
        {before !== null && <div className="text-note text-graphite">was {before}</div>}
        {missing && (
          <p id={`${id}-missing`} className="text-note text-red">
            <span aria-hidden="true">▲ </span>Not chosen yet.
          </p>
        )}
      </div>
      <div className={cn('grid grid-cols-1 gap-2', options.length > 2 ? 'sm:grid-cols-3' : 'sm:grid-cols-2')}>
        {options.map(({ value, label, text }, i) => (
          <Option
            key={value}
            group={id}
            inputRef={i === 0 ? firstRef : undefined}
            chosen={choice === value}
            onChosen={() => onChoice(value)}
            label={label}
            text={text}
            effect={effects === undefined ? ' ' : effectInWords(effects.get(value) ?? null, units)}
          />
        ))}
      </div>
    </div>
  );
}

interface OptionProps {
  group: string;
  inputRef: Ref<HTMLInputElement> | undefined;
  chosen: boolean;
  onChosen: () => void;
  label: string;
  text: string;
  effect: ReactNode;
}

function Option({ group, inputRef, chosen, onChosen, label, text, effect }: OptionProps) {
  const id = useId();
  return (
    <label
      htmlFor={id}
      className={cn(
        'grid grid-cols-[auto_minmax(0,1fr)] content-start gap-x-2 rounded-md border px-2.5 py-1.5 *:col-start-2',
        chosen ? 'border-ink bg-ink-wash' : 'border-strong-rule hover:border-ink',
      )}
    >
      <input
        id={id}
        ref={inputRef}
        type="radio"
        name={group}
        checked={chosen}
        onChange={onChosen}
        className="col-start-1! row-span-3 mt-1 size-4 accent-ink"
      />
      <span className="text-label text-graphite">{label}</span>
      <span className="font-semibold">{text}</span>
      <span className="min-h-[1.125rem] text-note text-graphite">{effect}</span>
    </label>
  );
}

/** What one side made of it: the value alone where one field is in question, else all that it did. */
function sideInWords(
  conflict: PlanConflict,
  changes: readonly PlanChange[],
  materials: Plan['materials'],
  units: Units,
): string {
  if (conflict.field === 'order') return changes === conflict.mine ? 'my order' : 'the other order';
  const [only, ...more] = changes;
  if (!only) return 'as it was';
  if (conflict.field !== null && more.length === 0) return valueInWords(only.to, only, materials, units);
  return changesInWords(changes, materials, units)
    .map(({ text }) => text)
    .join(', ');
}

function beforeInWords(
  { field, mine, theirs }: PlanConflict,
  materials: Plan['materials'],
  units: Units,
): string | null {
  const change = mine[0] ?? theirs[0];
  if (!change || field === null || field === 'order' || change.from === null) return null;
  return valueInWords(change.from, change, materials, units);
}
