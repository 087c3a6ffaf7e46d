import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Field } from '#client/components/ui/field.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { ApiError } from '#client/lib/api.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { useImport } from './import-plans.ts';
import { readPlanFile, type ReadPlans } from './plan-file.ts';

interface ImportDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onImported: (gliders: readonly GliderDto[]) => void;
}

/** Problems listed at most; a file of another kind may have thousands. */
const LISTED = 12;

/** Brings plans in from a JSON file; shows everything that is wrong with it and imports nothing until it is right. */
export function ImportDialog({ open, onOpenChange, onImported }: ImportDialogProps) {
  const [read, setRead] = useState<ReadPlans | null>(null);
  const { bring, error, pending, done, reset } = useImport();
  const change = (next: boolean) => {
    if (!next) {
      setRead(null);
      reset();
    }
    onOpenChange(next);
  };
  const choose = async (file: File | undefined) => {
    reset();
    setRead(file ? await readPlanFile(file) : null);
  };
  const plans = read && 'plans' in read ? read.plans : [];
  const problems = read && 'problems' in read ? read.problems : refusals(error);
  const take = () =>
    void bring(plans).then((gliders) => {
      if (gliders === null) return;
      change(false);
      onImported(gliders);
    });

  return (
    <Dialog
      open={open}
      onOpenChange={change}
      title="Import plans"
      description="A plan, or several, downloaded from Featherbeam or written to the same form, as JSON."
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
      {plans.length > 0 && problems.length === 0 && (
        <p className="text-note text-graphite">{contentsOf(plans)}</p>
      )}
      {pending && plans.length > 1 && (
        <p role="status" className="mt-2 text-note">
          {done} of {plans.length} are in.
        </p>
      )}
      <DialogActions>
        <Button onClick={() => change(false)}>Cancel</Button>
        <Button
          variant="primary"
          disabled={plans.length === 0}
          onClick={take}
          pending={pending}
          pendingText="Importing …"
        >
          Import
        </Button>
      </DialogActions>
    </Dialog>
  );
}

function contentsOf(plans: readonly Plan[]): string {
  const [plan] = plans;
  if (plans.length > 1 || !plan) {
    const names = plans.slice(0, 5).map(({ name }) => name);
    return `${plans.length} plans: ${names.join(', ')}${plans.length > names.length ? ' …' : ''}`;
  }
  const parts = plan.surfaces.reduce((sum, surface) => sum + surface.parts.length, 0);
  return `${plan.name}: ${count(plan.surfaces.length, 'surface')}, ${count(parts, 'part')}, ${count(plan.items.length, 'item')}.`;
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
