import { useRef, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextArea } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { SaveState, Workspace } from '#client/lib/workspace.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { useSaveSheet } from './queries.ts';

interface SaveSheetProps {
  workspace: Workspace;
  gliderId: string;
}

const WAITS: Record<Exclude<SaveState, 'saved'>, string> = {
  saving: 'The plan is being saved; a moment.',
  unsaved: 'The plan is about to be saved; a moment.',
  offline: 'The plan is not saved yet: no connection. A sheet is made from the saved plan.',
  conflict: 'The plan was changed elsewhere. Settle that first.',
  invalid: 'The drawing has to be mended first: a sheet is made from a plan that is saved.',
};

/** Freezes the saved plan under the next number, with a note. */
export function SaveSheet({ workspace, gliderId }: SaveSheetProps) {
  const [note, setNote] = useState('');
  const wish = useRef<string | null>(null);
  const save = useSaveSheet(gliderId);
  const say = useToast();
  const { saveState } = workspace;
  const locked = saveState !== 'saved';

  const submit = () => {
    wish.current ??= crypto.randomUUID();
    save.mutate(
      { note: note.trim(), wish: wish.current },
      {
        onSuccess: (made) => {
          wish.current = null;
          setNote('');
          say(`Sheet ${made.number} is saved.`);
        },
      },
    );
  };

  return (
    <form
      className="max-w-xl"
      onSubmit={(event) => {
        event.preventDefault();
        if (!locked && !save.isPending) submit();
      }}
    >
      <TextArea
        label="Note on the sheet"
        hint="What it is for, or what was done: “as built, before covering”."
        rows={2}
        maxLength={LIMITS.note.max}
        value={note}
        onChange={(event) => {
          // Another note is another wish.
          wish.current = null;
          setNote(event.target.value);
        }}
      />
      {save.error && (
        <Notice tone="red" word="Not saved" live className="mb-3">
          {save.error.message} The note is kept here; try again.
        </Notice>
      )}
      <div className="flex flex-wrap items-center gap-3">
        <Button
          type="submit"
          variant="primary"
          disabled={locked}
          pending={save.isPending}
          pendingText="Saving …"
        >
          Save a sheet
        </Button>
        <p className="text-note text-graphite" role="status">
          {saveState === 'saved' ? '' : WAITS[saveState]}
        </p>
      </div>
    </form>
  );
}
