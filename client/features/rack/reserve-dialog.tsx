import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { GliderSelect } from './glider-select.tsx';
import { useReservePiece } from './mutations.ts';

/** Keeps a piece for a glider. */
export function ReserveDialog({ piece, onClose }: { piece: StockPieceDto; onClose: () => void }) {
  const [gliderId, setGliderId] = useState(piece.reservedFor?.id ?? null);
  const mutation = useReservePiece();
  const say = useToast();
  const reserve = () =>
    mutation.mutate(
      { id: piece.id, gliderId },
      {
        onSuccess: ({ number, reservedFor }) => {
          onClose();
          say(
            reservedFor ? `Piece ${number} is reserved for ${reservedFor.name}.` : `Piece ${number} is free.`,
          );
        },
      },
    );
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={`Reserve piece ${piece.number}`}>
      {mutation.error && (
        <Notice tone="red" live word="Not reserved." className="mb-3">
          {mutation.error.message}
        </Notice>
      )}
      <GliderSelect value={gliderId} onValue={setGliderId} now={piece.reservedFor} none="Choose …" />
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
        <Button
          variant="primary"
          onClick={reserve}
          disabled={gliderId === null}
          pending={mutation.isPending}
          pendingText="Reserving …"
        >
          Reserve
        </Button>
      </DialogActions>
    </Dialog>
  );
}
