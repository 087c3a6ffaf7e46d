import { useState } from 'react';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { Menu, MenuItem } from '#client/components/ui/menu.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { Plan } from '#shared/core/plan.ts';
import { ImportDialog } from './import-dialog.tsx';
import { useCreateGlider } from './mutations.ts';
import { samplePlan } from './sample-plan.ts';
import { startPlan } from './start-plan.ts';
import { useWish } from './use-wish.ts';

/** Lays a new glider on the bench and opens it. */
export function useNewGlider(onOpen: (gliderId: string) => void) {
  const create = useCreateGlider();
  const wish = useWish();
  const say = useToast();
  const begin = (plan: Plan) => {
    if (create.isPending) return;
    create.mutate(
      { plan, wish: wish.current() },
      {
        onSuccess: ({ id }) => {
          wish.granted();
          onOpen(id);
        },
        onError: (error) => say(error.message),
      },
    );
  };
  return {
    pending: create.isPending,
    begin,
    blank: () => begin(startPlan('New glider')),
    fromSample: () => begin(samplePlan),
  };
}

/** The ways to begin: a few wishes, a blank sheet, the sample, a file. */
interface NewGliderProps {
  onOpen: (gliderId: string) => void;
}

export function NewGliderMenu({ onOpen, onGuided }: NewGliderProps & { onGuided: () => void }) {
  const { pending, blank, fromSample } = useNewGlider(onOpen);
  const [importing, setImporting] = useState(false);
  return (
    <>
      <Menu
        trigger={
          <button type="button" disabled={pending} className={buttonClass('primary')}>
            {pending ? <span role="status">One moment …</span> : 'New glider'}
            <svg viewBox="0 0 10 6" width="10" height="6" aria-hidden="true">
              <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.6" />
            </svg>
          </button>
        }
      >
        <MenuItem onSelect={onGuided}>From a few wishes …</MenuItem>
        <MenuItem onSelect={blank}>Blank sheet</MenuItem>
        <MenuItem onSelect={fromSample}>Copy of the sample</MenuItem>
        <MenuItem onSelect={() => setImporting(true)}>Import plans …</MenuItem>
      </Menu>
      <Importer open={importing} onOpenChange={setImporting} onOpen={onOpen} />
    </>
  );
}

/** The same ways as buttons, beside the wishes. */
export function OtherStarts({ onOpen }: NewGliderProps) {
  const { pending, blank, fromSample } = useNewGlider(onOpen);
  const [importing, setImporting] = useState(false);
  return (
    <>
      <Button onClick={blank} disabled={pending}>
        Blank sheet
      </Button>
      <Button onClick={fromSample} disabled={pending}>
        Copy of the sample
      </Button>
      <Button onClick={() => setImporting(true)}>Import plans …</Button>
      <Importer open={importing} onOpenChange={setImporting} onOpen={onOpen} />
    </>
  );
}

interface ImporterProps extends NewGliderProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

function Importer({ onOpen, ...dialog }: ImporterProps) {
  const say = useToast();
  return (
    <ImportDialog
      {...dialog}
      onImported={(gliders) => {
        const [only] = gliders;
        if (gliders.length === 1 && only) onOpen(only.id);
        else say(`${gliders.length} gliders lie on the bench.`);
      }}
    />
  );
}
