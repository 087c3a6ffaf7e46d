import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import type { WeighingInput } from '#shared/schemas/weighing.ts';
import type { Noted } from '#client/lib/built/account.ts';

interface CorrectDialogProps {
  noted: Noted;
  onClose: () => void;
  onNote: (changes: Partial<WeighingInput>) => void;
}

/** Another reading in the place of one, or none; the first stays to be read, with the reason. */
export function CorrectDialog({ noted, onClose, onNote }: CorrectDialogProps) {
  const [reading, setReading] = useState<number | null>(noted.input.values[0] ?? null);
  const [reason, setReason] = useState('');
  const [asked, setAsked] = useState(false);
  const { tare } = noted.input;
  const missing = reason.trim() === '' ? 'Say why.' : undefined;
  const light = reading !== null && reading < tare ? 'Less than the tare.' : undefined;
  const correct = () => {
    setAsked(true);
    if (missing || light || reading === null) return;
    onNote({
      values: [reading],
      reason: reason.trim(),
      withdraws: false,
      weighedAt: new Date().toISOString(),
    });
  };
  const withdraw = () => {
    setAsked(true);
    if (missing) return;
    onNote({ values: [], reason: reason.trim(), withdraws: true, weighedAt: new Date().toISOString() });
  };
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={`Correct: ${noted.input.title}`}>
      <p className="mb-3 text-graphite">
        What was written down stays to be read; this one counts in its place.
      </p>
      <NumberField
        label="The scale showed"
        quantity="mass"
        value={reading}
        min={0}
        max={100_000}
        hint={asked ? light : undefined}
        onChange={(value) => setReading(value)}
      />
      <TextField
        label="Why"
        value={reason}
        maxLength={2000}
        error={asked ? missing : undefined}
        onChange={({ currentTarget }) => setReason(currentTarget.value)}
      />
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
        <Button variant="danger" onClick={withdraw}>
          Take it back
        </Button>
        <Button variant="primary" onClick={correct}>
          Write the correction down
        </Button>
      </DialogActions>
    </Dialog>
  );
}
