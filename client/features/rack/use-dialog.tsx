import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { GliderSelect } from './glider-select.tsx';
import { useBuildIn } from './mutations.ts';

interface Leftover {
  length: number | null;
  width: number | null;
}

/** Marks a piece as built in, and puts what is left of it back on the rack. */
export function UseDialog({ piece, onClose }: { piece: StockPieceDto; onClose: () => void }) {
  const [gliderId, setGliderId] = useState(piece.reservedFor?.id ?? null);
  const [leftovers, setLeftovers] = useState<readonly Leftover[]>([]);
  const mutation = useBuildIn();
  const say = useToast();
  const tube = piece.kind === 'tube';
  const whole = leftovers.flatMap(({ length, width }) =>
    length !== null && length > 0 && width !== null && width > 0 ? [{ length, width }] : [],
  );
  const change = (at: number, next: Partial<Leftover>) =>
    setLeftovers(leftovers.map((one, i) => (i === at ? { ...one, ...next } : one)));
  const use = () =>
    mutation.mutate(
      { id: piece.id, use: { gliderId, leftovers: whole } },
      {
        onSuccess: ({ leftovers: back }) => {
          onClose();
          const told =
            back.length === 0 ? '' : ` Back on the rack: ${back.map(({ number }) => number).join(', ')}.`;
          say(`Piece ${piece.number} is used.${told}`);
        },
      },
    );
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Piece ${piece.number} is used`}
      description="This is not taken back; what is left over may go back on the rack as pieces of its own. Sanding dust harms the lungs: wear a mask."
    >
      {mutation.error && (
        <Notice tone="red" live word="Not marked as used." className="mb-3">
          {mutation.error.message}
        </Notice>
      )}
      <GliderSelect value={gliderId} onValue={setGliderId} now={piece.reservedFor} none="Something else" />
      {leftovers.map(({ length, width }, i) => (
        <fieldset key={i} className="flex items-start gap-3">
          <legend className="sr-only">Leftover {i + 1}</legend>
          <NumberField
            label="Length left"
            quantity="length"
            above={0}
            optional
            max={piece.length}
            value={length}
            onChange={(value) => change(i, { length: value })}
          />
          {!tube && (
            <NumberField
              label="Width left"
              quantity="length"
              above={0}
              optional
              max={piece.width}
              value={width}
              onChange={(value) => change(i, { width: value })}
            />
          )}
          <Button
            variant="plain"
            className="mt-6"
            aria-label={`Leave out leftover ${i + 1}`}
            onClick={() => setLeftovers(leftovers.toSpliced(i, 1))}
          >
            ✕
          </Button>
        </fieldset>
      ))}
      {leftovers.length < LIMITS.splitParts.max && (
        <Button onClick={() => setLeftovers([...leftovers, { length: null, width: piece.width }])}>
          Add a leftover
        </Button>
      )}
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
        <Button
          variant="primary"
          onClick={use}
          disabled={whole.length < leftovers.length}
          pending={mutation.isPending}
          pendingText="Saving …"
        >
          Mark as used
        </Button>
      </DialogActions>
    </Dialog>
  );
}
