import { useMemo, useRef, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import type { MergeChoice, PlanConflict } from '#shared/core/merge-fields.ts';
import type { Units } from '#shared/format/units.ts';
import { figuresOf, joinedAs, useEffects } from './conflict-effects.ts';
import { ConflictRow } from './conflict-row.tsx';
import type { Desk, Kept } from './desk-state.ts';

interface ConflictDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  desk: Desk;
  theirs: Kept;
  userName: string;
  onDecide: (choices: ReadonlyMap<string, MergeChoice>) => void;
  onKeepAsNew: () => void;
  pending: boolean;
}

/** Both sides of whatever two people changed at once; nothing is saved over anybody before each line is chosen. */
export function ConflictDialog(props: ConflictDialogProps) {
  const { open, onOpenChange, theirs, userName } = props;
  const own = theirs.updatedBy === userName;
  const who = own ? 'Another window of yours' : theirs.updatedBy;
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Both changed the same"
      description={`${who} saved at ${formatMoment(theirs.updatedAt)}, while you had edits of your own. What does not collide is joined already. Choose what stands in each line; until then nothing is saved.`}
      wide
    >
      <Choices {...props} other={own ? 'Other window' : theirs.updatedBy} />
    </Dialog>
  );
}

function Choices(props: ConflictDialogProps & { other: string }) {
  const { desk, theirs, other, onDecide, onKeepAsNew, onOpenChange, pending } = props;
  const { conflicts, base, history } = desk;
  const mine = history.present;
  const sheets = useMemo(() => ({ base: base.plan, mine, theirs: theirs.plan }), [base, mine, theirs]);
  const effects = useEffects(sheets, conflicts);
  const [choices, setChoices] = useState<ReadonlyMap<string, MergeChoice>>(new Map());
  const [asked, setAsked] = useState(false);
  const fields = useRef(new Map<string, HTMLInputElement>());
  const units = useUnits();
  const open = conflicts.filter(({ id }) => !choices.has(id));
  const materials = { ...base.plan.materials, ...theirs.plan.materials, ...mine.materials };
  const all = (choice: MergeChoice) => setChoices(new Map(conflicts.map(({ id }) => [id, choice])));
  const decide = () => {
    const [first] = open;
    if (!first) return onDecide(choices);
    setAsked(true);
    fields.current.get(first.id)?.focus();
  };

  return (
    <>
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => all('mine')}>All mine</Button>
        <Button onClick={() => all('theirs')}>
          {other === 'Other window' ? 'All of the other' : `All of ${other}’s`}
        </Button>
      </div>
      <div className="mt-2 border-t border-rule">
        {conflicts.map((conflict) => (
          <ConflictRow
            key={conflict.id}
            conflict={conflict}
            materials={materials}
            other={other}
            effects={effects.get(conflict.id)}
            choice={choices.get(conflict.id)}
            onChoice={(choice) => setChoices(new Map(choices).set(conflict.id, choice))}
            missing={asked && !choices.has(conflict.id)}
            firstRef={(input) => {
              if (input) fields.current.set(conflict.id, input);
            }}
          />
        ))}
      </div>
      <Outcome {...{ sheets, choices, conflicts, open: open.length, asked, units }} />
      <DialogActions>
        <Button variant="plain" onClick={() => onOpenChange(false)}>
          Later
        </Button>
        <Button onClick={onKeepAsNew} pending={pending}>
          Keep mine as a new glider
        </Button>
        <Button variant="primary" onClick={decide}>
          Save as chosen
        </Button>
      </DialogActions>
    </>
  );
}

interface OutcomeProps {
  sheets: Parameters<typeof joinedAs>[0];
  choices: ReadonlyMap<string, MergeChoice>;
  conflicts: readonly PlanConflict[];
  /** lines that are not chosen yet */
  open: number;
  asked: boolean;
  units: Units;
}

/** What the model comes to as chosen so far. */
function Outcome({ sheets, choices, conflicts, open, asked, units }: OutcomeProps) {
  const figures = useMemo(() => figuresOf(joinedAs(sheets, choices)), [sheets, choices]);
  const left =
    open === 0 ? '' : `${open} of ${conflicts.length} ${conflicts.length === 1 ? 'line' : 'lines'} to choose`;
  return (
    <p role="status" className="mt-3 text-note">
      {left !== '' && <span className={asked ? 'font-semibold text-red' : 'text-graphite'}>{left}. </span>}
      {open === 0 && figures && (
        <>
          As chosen it weighs <b className="font-semibold">{units.format(figures.mass, 'mass')}</b>
          {figures.percentMac !== null && (
            <>
              {' '}
              and balances at{' '}
              <b className="font-semibold">{units.format(figures.percentMac, 'percentMac')} MAC</b>
            </>
          )}
          .
        </>
      )}
      {open === 0 && !figures && (
        <span className="text-ochre">
          These choices do not go together: what is wrong is told at the drawing, and nothing is saved before
          it is mended.
        </span>
      )}
    </p>
  );
}
