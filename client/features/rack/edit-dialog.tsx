import { useState, type FormEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextArea, TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { ApiError } from '#client/lib/api.ts';
import { useUnits } from '#client/lib/units.ts';
import { stockPiece, type StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { draftOf, pieceOf, type DraftErrors, type PieceDraft } from './draft.ts';
import { GrainSelect } from './entry-form.tsx';
import { densityText, densityWhileTyping } from './figures.ts';
import { useSavePiece } from './mutations.ts';
import { PieceFields } from './piece-fields.tsx';

/** Everything that its owner says of a piece. */
export function EditDialog({ piece, onClose }: { piece: StockPieceDto; onClose: () => void }) {
  const units = useUnits();
  const say = useToast();
  const mutation = useSavePiece();
  const [target, setTarget] = useState(piece);
  const [draft, setDraft] = useState<PieceDraft>(draftOf(piece));
  const [errors, setErrors] = useState<DraftErrors>({});
  const theirs = currentOf(mutation.error);
  const change = (next: Partial<PieceDraft>) => {
    setDraft((before) => ({ ...before, ...next }));
    setErrors({});
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const read = pieceOf(draft);
    if ('errors' in read) return setErrors(read.errors);
    mutation.mutate(
      { piece: target, input: read.input },
      {
        onSuccess: () => {
          onClose();
          say(`Piece ${piece.number} was saved.`);
        },
      },
    );
  };
  const take = (current: StockPieceDto, own: PieceDraft) => {
    setTarget(current);
    setDraft(own);
    mutation.reset();
  };
  const density = densityWhileTyping(draft, draft.mass);
  return (
    <Dialog open wide onOpenChange={(open) => !open && onClose()} title={`Edit piece ${piece.number}`}>
      <form noValidate onSubmit={submit}>
        {theirs ? (
          <Notice
            tone="ochre"
            live
            word="Changed meanwhile."
            className="mb-3"
            actions={
              <>
                <Button onClick={() => take(theirs, draft)}>Keep mine</Button>
                <Button onClick={() => take(theirs, draftOf(theirs))}>Take theirs</Button>
              </>
            }
          >
            This piece was saved elsewhere while you were editing. Yours is not saved yet.
          </Notice>
        ) : (
          (errors.root ?? mutation.error?.message) && (
            <Notice tone="red" live word="Not saved." className="mb-3">
              {errors.root ?? mutation.error?.message}
            </Notice>
          )
        )}
        <div className="[&>div]:lg:grid-cols-4">
          <PieceFields draft={draft} errors={errors} onDraft={change} />
        </div>
        <p className="mb-3 min-h-row content-center font-semibold" aria-live="polite">
          {density !== null && draft.material !== null && densityText(draft.material, density, units)}
        </p>
        <div className="grid items-start gap-x-4 sm:grid-cols-3">
          {draft.kind === 'sheet' && (
            <GrainSelect value={draft.grainCut} onValue={(cut) => change({ grainCut: cut })} />
          )}
          <NumberField
            label="Step of the scale"
            quantity="mass"
            optional
            value={draft.resolution}
            onChange={(value, problem) =>
              change({ resolution: problem === null || problem === 'missing' ? value : NaN })
            }
            error={errors.resolution}
          />
          <TextField
            label="Grade, in your words"
            value={draft.grade}
            onChange={(event) => change({ grade: event.target.value })}
            error={errors.grade}
          />
        </div>
        <TextArea
          label="Note"
          rows={2}
          value={draft.note}
          onChange={(event) => change({ note: event.target.value })}
          error={errors.note}
        />
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button
            type="submit"
            variant="primary"
            disabled={theirs !== null}
            pending={mutation.isPending}
            pendingText="Saving …"
          >
            Save
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

function currentOf(error: Error | null): StockPieceDto | null {
  if (!(error instanceof ApiError) || error.status !== 412) return null;
  return stockPiece.safeParse(error.problem['current']).data ?? null;
}
