import { useMemo, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Field } from '#client/components/ui/field.tsx';
import { TextArea, TextField } from '#client/components/ui/text-field.tsx';
import type { SectionSpec } from '#shared/core/plan.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { readSectionText } from '#shared/sections/read-section.ts';
import { problemWords } from './section-findings.ts';
import { SectionPreview } from './section-preview.tsx';
import { pointsText } from './section-text.ts';

interface PointsDialogProps {
  title: string;
  /** the section as it is; its own points are what the dialog opens with */
  spec: SectionSpec;
  /** `everywhere`: for root and tip of all panels */
  onSpec: (spec: SectionSpec, everywhere: boolean) => void;
  onClose: () => void;
}

/** Bytes of a file of coordinates; far more than any has. */
const LARGEST = 2_000_000;

/** Takes a section's own coordinates from a file or from a pasted text, and shows them before they are taken. */
export function PointsDialog({ title, spec, onSpec, onClose }: PointsDialogProps) {
  const before = 'points' in spec ? spec : null;
  const [typedName, setTypedName] = useState<string | null>(before?.name ?? null);
  const [fileTitle, setFileTitle] = useState('');
  const [text, setText] = useState(before ? pointsText(before) : '');
  const [refusedFile, setRefusedFile] = useState<string>();
  const [everywhere, setEverywhere] = useState(false);
  const [asked, setAsked] = useState(false);
  const reading = useMemo(() => readSectionText(text), [text]);
  const section = 'section' in reading ? reading.section : null;
  const isEmpty = text.trim() === '';
  const problem = 'problem' in reading && (asked || !isEmpty) ? problemWords(reading.problem) : undefined;
  const name = typedName ?? section?.name ?? fileTitle;

  const choose = async (file: File | undefined) => {
    setRefusedFile(undefined);
    if (!file) return;
    if (file.size > LARGEST) {
      setRefusedFile('This file is too large for a section.');
      return;
    }
    try {
      setText(await file.text());
      setFileTitle(file.name.replace(/\.[^.]*$/, ''));
    } catch {
      setRefusedFile('This file cannot be read.');
    }
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={title}
      description="Points round from the trailing edge, or upper and lower face one after the other; of the chord, in per cent or at any size."
      wide
    >
      <form
        className="grid gap-y-1"
        onSubmit={(event) => {
          event.preventDefault();
          setAsked(true);
          if (section && name.trim() !== '') {
            onSpec({ name: name.trim(), points: section.points }, everywhere);
          }
        }}
      >
        <div className="grid gap-x-6 sm:grid-cols-2">
          <div>
            <Field label="Coordinate file" error={refusedFile}>
              {(control) => (
                <input
                  {...control}
                  type="file"
                  accept=".dat,.txt,.csv,.cor,text/plain"
                  onChange={(event) => void choose(event.target.files?.[0])}
                  className="inked min-h-row w-full px-2 py-1.5 file:mr-3 file:rounded-md file:border file:border-ink file:bg-sheet file:px-2 file:font-semibold file:text-ink"
                />
              )}
            </Field>
            <TextField
              label="Name"
              value={name}
              maxLength={LIMITS.name.max}
              error={asked && name.trim() === '' ? 'Give it a name.' : undefined}
              onChange={(event) => setTypedName(event.target.value)}
            />
          </div>
          <TextArea
            label="Points"
            hint="One to a line, x and z; or paste the whole file."
            rows={6}
            spellCheck={false}
            value={text}
            error={problem}
            onChange={(event) => setText(event.target.value)}
          />
        </div>
        {section && <SectionPreview section={section} />}
        <Checkbox label="For root and tip of all panels" checked={everywhere} onValue={setEverywhere} />
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="primary">
            Use these points
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
