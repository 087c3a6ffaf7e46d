import { useState, type FormEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { useNameSave } from '../mutations.ts';

interface NameDialogProps {
  gliderId: string;
  /** null while it is closed */
  save: GliderSaveDto | null;
  onClose: () => void;
}

/** Gives a state a name to find it by, or takes it away. */
export function NameDialog({ gliderId, save, onClose }: NameDialogProps) {
  return (
    <Dialog
      open={save !== null}
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title="Name this state"
      description={save ? `The state of ${formatMoment(save.savedAt)}, by ${save.savedBy}.` : ''}
    >
      {save && <NameForm key={save.version} gliderId={gliderId} save={save} onClose={onClose} />}
    </Dialog>
  );
}

function NameForm({ gliderId, save, onClose }: NameDialogProps & { save: GliderSaveDto }) {
  const [name, setName] = useState(save.name ?? '');
  const naming = useNameSave(gliderId);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    naming.mutate({ version: save.version, name }, { onSuccess: onClose });
  };
  return (
    <form onSubmit={submit}>
      <TextField
        label="Name"
        hint="Such as “Before cutting”. Leave it empty to take the name away."
        value={name}
        maxLength={LIMITS.name.max}
        onChange={(event) => setName(event.target.value)}
        error={naming.error ? naming.error.message : undefined}
      />
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
        <Button variant="primary" type="submit" pending={naming.isPending} pendingText="Saving …">
          Save the name
        </Button>
      </DialogActions>
    </form>
  );
}
