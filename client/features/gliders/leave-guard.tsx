import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import type { Workspace } from '#client/lib/workspace.ts';

interface LeaveGuardProps {
  workspace: Workspace;
  /** Addresses that keep the glider open. */
  within: (pathname: string) => boolean;
}

/** Warns before edits are left behind that the server does not hold. */
export function LeaveGuard({ workspace, within }: LeaveGuardProps) {
  const { saveState, problem, kind } = workspace;
  const unsent = kind === 'saved' && saveState !== 'saved';
  // What is only waiting for its turn is sent on the way out.
  const stuck = unsent && saveState !== 'saving' && (saveState !== 'unsaved' || problem !== undefined);

  useEffect(() => {
    if (!unsent) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    addEventListener('beforeunload', warn);
    return () => removeEventListener('beforeunload', warn);
  }, [unsent]);

  const blocker = useBlocker(({ nextLocation }) => stuck && !within(nextLocation.pathname));
  const blocked = blocker.state === 'blocked';
  return (
    <Dialog
      open={blocked}
      onOpenChange={(open) => {
        if (!open && blocked) blocker.reset();
      }}
      title="Leave with edits that are not saved?"
      description="They are kept on this device and offered again when you open the glider here."
    >
      <DialogActions>
        <Button onClick={() => blocked && blocker.proceed()}>Leave</Button>
        <Button variant="primary" onClick={() => blocked && blocker.reset()}>
          Stay
        </Button>
      </DialogActions>
    </Dialog>
  );
}
