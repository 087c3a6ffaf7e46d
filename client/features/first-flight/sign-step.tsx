import { useState, type SubmitEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextArea, TextField } from '#client/components/ui/text-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';
import { Step } from './step.tsx';
import type { ChangeDraft } from './use-draft.ts';

interface SignStepProps {
  draft: FlightDraft;
  change: ChangeDraft;
  /** what is still missing, in words */
  missing: readonly string[];
  /** keeps the record on the device and sends it; @throws where the device cannot keep it */
  onSign: () => void;
}

/** The pilot's name under it all. After that the record stays as it is; a later one may follow it. */
export function SignStep({ draft, change, missing, onSign }: SignStepProps) {
  const [problem, setProblem] = useState<string | null>(null);
  const [tried, setTried] = useState(false);
  const nameless = draft.signature.trim() === '';
  const sign = (event: SubmitEvent) => {
    event.preventDefault();
    setTried(true);
    if (missing.length > 0 || nameless) return;
    try {
      onSign();
      setTried(false);
      setProblem(null);
    } catch {
      setProblem(
        'This device cannot keep it: its storage is full or shut. Nothing is signed; leave the page open.',
      );
    }
  };
  return (
    <Step title="Sign">
      <form onSubmit={sign} noValidate className="mt-2">
        <TextArea
          label="Notes"
          value={draft.note}
          maxLength={LIMITS.note.max}
          onChange={({ currentTarget }) => change({ note: currentTarget.value })}
        />
        <TextField
          label="Pilot’s name"
          autoComplete="name"
          value={draft.signature}
          maxLength={LIMITS.name.max}
          hint="Typed by you, it is your signature; the time is taken from this device."
          error={tried && nameless ? 'Sign with your name.' : undefined}
          onChange={({ currentTarget }) => change({ signature: currentTarget.value })}
        />
        {tried && missing.length > 0 && (
          <Notice tone="red" word="Not yet:" live className="mb-3">
            {missing.join(' ')}
          </Notice>
        )}
        {problem !== null && (
          <Notice tone="red" word="Not kept:" live className="mb-3">
            {problem}
          </Notice>
        )}
        <Button type="submit" variant="primary" className="min-h-12 w-full sm:w-auto">
          Sign and keep
        </Button>
        <p className="mt-1 text-note text-graphite">
          A signed record is never changed. Without a connection it waits on this device and goes by itself,
          once.
        </p>
      </form>
    </Step>
  );
}
