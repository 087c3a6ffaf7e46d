import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { useDeletePiece } from './mutations.ts';

interface DeleteDialogProps {
  piece: StockPieceDto;
  onClose: () => void;
  onDeleted: () => void;
}

/** Takes a piece away for good, or says which glider holds it. */
export function DeleteDialog({ piece, onClose, onDeleted }: DeleteDialogProps) {
  const mutation = useDeletePiece();
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Delete piece ${piece.number}?`}
      description="It goes for good, with its note and photo. Its number is not given again."
    >
      {mutation.error && (
        <Notice tone="red" live word="Not deleted." className="mb-2">
          {mutation.error.message}
        </Notice>
      )}
      <DialogActions>
        <Button onClick={onClose}>Keep it</Button>
        <Button
          variant="danger"
          onClick={() => mutation.mutate(piece, { onSuccess: onDeleted })}
          pending={mutation.isPending}
          pendingText="Deleting …"
        >
          Delete
        </Button>
      </DialogActions>
    </Dialog>
  );
}
