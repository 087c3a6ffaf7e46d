import { useRef, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { ImportPreview } from './import-preview.tsx';
import { useImportPieces, usePreviewImport } from './mutations.ts';

/** A table of stock from a file: looked through first, taken in when it is confirmed. */
export function ImportDialog({ onClose }: { onClose: () => void }) {
  const input = useRef<HTMLInputElement>(null);
  const [name, setName] = useState<string | null>(null);
  const [wish, setWish] = useState('');
  const preview = usePreviewImport();
  const take = useImportPieces();
  const say = useToast();
  const choose = (file: File) => {
    setName(file.name);
    setWish(crypto.randomUUID());
    take.reset();
    preview.mutate(file);
  };
  const rows = preview.data?.rows ?? [];
  const confirm = () =>
    take.mutate(
      { rows: rows.map(({ piece }) => piece), wish },
      {
        onSuccess: ({ count, firstNumber, lastNumber }) => {
          onClose();
          say(
            count === 1
              ? `1 piece was taken in, number ${firstNumber}.`
              : `${count} pieces were taken in, numbers ${firstNumber} to ${lastNumber}.`,
          );
        },
      },
    );
  const error = take.error ?? preview.error;
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title="Import a table"
      description="A CSV file with a first line of titles: material, length, width and thickness at least. Units may stand in the titles, as in “Length (in)”; without them mm and g are meant. Nothing is stored before you confirm."
    >
      {error && (
        <Notice tone="red" live word={take.error ? 'Nothing was taken in.' : 'Not read.'} className="mb-3">
          {error.message}
        </Notice>
      )}
      <input
        ref={input}
        type="file"
        accept=".csv,.tsv,.txt,text/csv"
        aria-label="Table of stock"
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          const file = event.target.files?.[0];
          if (file) choose(file);
          event.target.value = '';
        }}
      />
      <p className="flex flex-wrap items-center gap-3">
        <Button onClick={() => input.current?.click()} pending={preview.isPending} pendingText="Reading …">
          {name === null ? 'Choose a file' : 'Choose another file'}
        </Button>
        {name !== null && <span className="min-w-0 truncate">{name}</span>}
      </p>
      {preview.data && <ImportPreview preview={preview.data} />}
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
        <Button
          variant="primary"
          onClick={confirm}
          disabled={rows.length === 0}
          pending={take.isPending}
          pendingText="Taking in …"
        >
          {rows.length === 0 ? 'Take in' : `Take in ${rows.length} ${rows.length === 1 ? 'piece' : 'pieces'}`}
        </Button>
      </DialogActions>
    </Dialog>
  );
}
