import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { ApiError } from '#client/lib/api.ts';
import { materialUses, type MaterialDto } from '#shared/schemas/material.ts';
import { useDeleteMaterial } from './mutations.ts';
import { UsesList } from './uses-dialog.tsx';

interface DeleteDialogProps {
  row: MaterialDto;
  onClose: () => void;
  gliderHref: (id: string) => string;
}

/** Deletes a material, or says where it is still used. */
export function DeleteDialog({ row, onClose, gliderHref }: DeleteDialogProps) {
  const mutation = useDeleteMaterial();
  const say = useToast();
  const uses = usesOf(mutation.error);
  const confirm = () =>
    mutation.mutate(row.id, {
      onSuccess: () => {
        onClose();
        say(`${row.name} was deleted.`);
      },
    });
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Delete ${row.name}?`}
      description={row.shared ? 'It goes from everybody’s table.' : 'It goes from your own materials.'}
    >
      {mutation.error && (
        <Notice tone="red" live word="Not deleted." className="mb-2">
          {uses ? 'It is still used:' : mutation.error.message}
        </Notice>
      )}
      {uses && <UsesList uses={uses} gliderHref={gliderHref} />}
      <DialogActions>
        <Button onClick={onClose}>{uses ? 'Close' : 'Keep it'}</Button>
        {!uses && (
          <Button variant="danger" onClick={confirm} pending={mutation.isPending} pendingText="Deleting …">
            Delete
          </Button>
        )}
      </DialogActions>
    </Dialog>
  );
}

function usesOf(error: Error | null) {
  if (!(error instanceof ApiError) || error.code !== 'material_in_use') return null;
  const parsed = materialUses.safeParse(error.problem['uses']);
  return parsed.success ? parsed.data : null;
}
