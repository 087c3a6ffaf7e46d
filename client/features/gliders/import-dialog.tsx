import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Field } from '#client/components/ui/field.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { ApiError } from '#client/lib/api.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { useCreateGlider } from './mutations.ts';
import { readPlanFile, type ReadPlan } from './plan-file.ts';
import { useWish } from './use-wish.ts';

interface ImportDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onImported: (glider: GliderDto) => void;
}

/** Problems listed at most; a file of another kind may have thousands. */
const LISTED = 12;

/** Brings a plan in from a JSON file; shows everything that is wrong with it and imports nothing until it is right. */
export function ImportDialog({ open, onOpenChange, onImported }: ImportDialogProps) {
  const [read, setRead] = useState<ReadPlan | null>(null);
  const create = useCreateGlider();
  const wish = useWish();
  const change = (next: boolean) => {
    if (!next) {
      setRead(null);
      create.reset();
    }
    onOpenChange(next);
  };
  const choose = async (file: File | undefined) => {
    create.reset();
    wish.granted();
    setRead(file ? await readPlanFile(file) : null);
  };
  const plan = read && 'plan' in read ? read.plan : null;
  const problems = read && 'problems' in read ? read.problems : refusals(create.error);
  const bring = () => {
    if (!plan) return;
    create.mutate(
      { plan, wish: wish.current() },
      {
        onSuccess: (glider) => {
          change(false);
          onImported(glider);
        },
      },
    );
  };

  return (
    <Dialog
      open={open}
      onOpenChange={change}
      title="Import a plan"
      description="A plan downloaded from Featherbeam, or one written to the same form, as JSON."
    >
      <Field label="Plan file">
        {(control) => (
          <input
            {...control}
            type="file"
            accept=".json,application/json"
            onChange={(event) => void choose(event.target.files?.[0])}
            className="inked min-h-row w-full px-2 py-1.5 file:mr-3 file:rounded-md file:border file:border-ink file:bg-sheet file:px-2 file:font-semibold file:text-ink"
          />
        )}
      </Field>
      {problems.length > 0 && <Problems problems={problems} />}
      {plan && problems.length === 0 && (
        <p className="text-note text-graphite">
          {plan.name}: {count(plan.surfaces.length, 'surface')},{' '}
          {count(
            plan.surfaces.reduce((sum, { parts }) => sum + parts.length, 0),
            'part',
          )}
          , {count(plan.items.length, 'item')}.
        </p>
      )}
      <DialogActions>
        <Button onClick={() => change(false)}>Cancel</Button>
        <Button
          variant="primary"
          disabled={!plan}
          onClick={bring}
          pending={create.isPending}
          pendingText="Importing …"
        >
          Import
        </Button>
      </DialogActions>
    </Dialog>
  );
}

function Problems({ problems }: { problems: readonly string[] }) {
  return (
    <>
      <Notice tone="red" live word="Not imported.">
        {problems.length === 1 ? 'One thing is wrong:' : `${problems.length} things are wrong:`}
      </Notice>
      <ul className="max-h-60 list-disc overflow-y-auto bg-red-wash py-1 pr-3 pb-2 pl-8 text-note">
        {problems.slice(0, LISTED).map((problem) => (
          <li key={problem}>{problem}</li>
        ))}
        {problems.length > LISTED && <li>and {problems.length - LISTED} more.</li>}
      </ul>
    </>
  );
}

function refusals(error: Error | null): string[] {
  if (error === null) return [];
  if (error instanceof ApiError && error.fields.length > 0) {
    return error.fields.map(
      ({ pointer, detail }) => `${pointer.replace(/^#\/(plan\/)?/, '').replaceAll('/', ', ')}: ${detail}`,
    );
  }
  return [error.message];
}

function count(number: number, noun: string): string {
  return `${number} ${noun}${number === 1 ? '' : 's'}`;
}
