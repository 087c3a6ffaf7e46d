import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useUnits } from '#client/lib/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { SplitInput } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { useSplitPiece } from './mutations.ts';
import { planSplit, type SplitPlan } from './split-plan.ts';
import { SplitPicture } from './split-picture.tsx';
import { sizeText } from './words.ts';

interface SplitDialogProps {
  piece: StockPieceDto;
  onClose: () => void;
}

/** Cuts a piece up; what comes of it is shown before it is done. */
export function SplitDialog({ piece, onClose }: SplitDialogProps) {
  const units = useUnits();
  const say = useToast();
  const mutation = useSplitPiece();
  const [along, setAlong] = useState<SplitInput['along']>('length');
  const [wanted, setWanted] = useState<(number | null)[]>([null]);
  const [kerf, setKerf] = useState<number | null>(0);
  const typed = wanted.filter((one) => one !== null);
  const cuts = { along, wanted: typed, kerf: kerf ?? NaN };
  const plan = typed.length === wanted.length ? planSplit(piece, cuts) : null;
  const possible = plan !== null && 'pieces' in plan;
  const split = () =>
    mutation.mutate(
      { id: piece.id, cuts },
      {
        onSuccess: ({ pieces }) => {
          onClose();
          say(`Piece ${piece.number} is now ${pieces.map(({ number }) => number).join(', ')}.`);
        },
      },
    );

  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title={`Cut up piece ${piece.number}`}
      description={`${sizeText(piece, units)}. Cut away from yourself, and keep the other hand behind the blade.`}
    >
      {mutation.error && (
        <Notice tone="red" live word="Not cut up." className="mb-3">
          {mutation.error.message}
        </Notice>
      )}
      <div className="grid gap-x-6 sm:grid-cols-2">
        <Select
          label="Divide"
          options={[
            { value: 'length', label: 'The length' },
            { value: 'width', label: 'The width', disabled: piece.kind === 'tube' },
          ]}
          value={along}
          onValue={(value) => setAlong(value === 'width' ? 'width' : 'length')}
        />
        <NumberField label="One cut takes away" quantity="length" min={0} value={kerf} onChange={setKerf} />
      </div>
      <ol className="grid gap-x-6 sm:grid-cols-2">
        {wanted.map((value, i) => (
          <li key={i} className="flex items-start gap-2">
            <div className="min-w-0 flex-1">
              <NumberField
                label={`Piece wanted ${i + 1}, ${along}`}
                quantity="length"
                above={0}
                optional
                value={value}
                onChange={(next) => setWanted(wanted.map((one, at) => (at === i ? next : one)))}
              />
            </div>
            {wanted.length > 1 && (
              <Button
                variant="plain"
                className="mt-6"
                aria-label={`Leave out piece ${i + 1}`}
                onClick={() => setWanted(wanted.toSpliced(i, 1))}
              >
                ✕
              </Button>
            )}
          </li>
        ))}
      </ol>
      {wanted.length < LIMITS.splitParts.max && (
        <Button onClick={() => setWanted([...wanted, wanted.at(-1) ?? null])}>One more</Button>
      )}
      <div className="mt-4" aria-live="polite">
        <Outcome piece={piece} plan={plan} along={along} />
      </div>
      <DialogActions>
        <Button onClick={onClose}>Leave it whole</Button>
        <Button
          variant="primary"
          onClick={split}
          disabled={!possible}
          pending={mutation.isPending}
          pendingText="Cutting …"
        >
          Cut up
        </Button>
      </DialogActions>
    </Dialog>
  );
}

interface OutcomeProps {
  piece: StockPieceDto;
  plan: SplitPlan | null;
  along: SplitInput['along'];
}

function Outcome({ piece, plan, along }: OutcomeProps) {
  const units = useUnits();
  if (plan === null) {
    return <p className="text-graphite">Type the pieces wanted; what is left over is shown here.</p>;
  }
  if ('missing' in plan) {
    return (
      <Notice tone="red" word="Too short.">
        {units.size(plan.missing)} more would be needed, cuts included.
      </Notice>
    );
  }
  const rest = plan.pieces.find((one) => one.rest);
  return (
    <>
      <SplitPicture piece={piece} plan={plan.pieces} along={along} />
      <p className="mt-2 font-semibold">
        {rest ? `${units.size(rest.measure)} of the ${along} is left over.` : 'Nothing is left over.'}
      </p>
      {piece.mass !== null && (
        <p className="text-note text-graphite">
          Masses: {plan.pieces.map(({ mass }) => units.format(mass, 'mass')).join(', ')}; in proportion to the
          volume, for no sheet is of one density. Weigh them again.
        </p>
      )}
    </>
  );
}
