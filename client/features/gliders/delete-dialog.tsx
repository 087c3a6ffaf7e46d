import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { useDeleteGlider } from './mutations.ts';

interface DeleteDialogProps {
  glider: GliderSummaryDto;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function DeleteDialog({ glider, open, onOpenChange }: DeleteDialogProps) {
  const mutation = useDeleteGlider();
  const say = useToast();
  // The row is gone with the glider, so what is said does not hang on it; a refusal is told here.
  const confirm = () =>
    void mutation.mutateAsync(glider.id).then(
      () => {
        onOpenChange(false);
        say(`${glider.name} was deleted.`);
      },
      () => undefined,
    );
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Delete ${glider.name}?`}
      description="Its plan, its log and its saved sheets go with it, for everybody it is shared with. This cannot be undone; download the plan first if you may want it again."
    >
      {mutation.error && (
        <Notice tone="red" live>
          {mutation.error.message}
        </Notice>
      )}
      <DialogActions>
        <Button onClick={() => onOpenChange(false)}>Keep it</Button>
        <Button variant="danger" onClick={confirm} pending={mutation.isPending} pendingText="Deleting …">
          Delete {glider.name}
        </Button>
      </DialogActions>
    </Dialog>
  );
}
