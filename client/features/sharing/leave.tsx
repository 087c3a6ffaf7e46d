import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { useLeave } from './mutations.ts';
import { Part } from './part.tsx';

interface LeaveProps {
  glider: GliderDto;
  onLeft: () => void;
}

/** Ends the reader's own membership. */
export function Leave({ glider, onLeft }: LeaveProps) {
  const [asking, setAsking] = useState(false);
  const leave = useLeave(glider.id);
  const say = useToast();
  const confirm = () =>
    void leave.mutateAsync().then(
      () => {
        say(`You have left ${glider.name}.`);
        onLeft();
      },
      () => undefined,
    );
  return (
    <Part
      title="Leave"
      note="It goes from your bench. What you drew stays with it, under your name in its log."
    >
      <Button variant="danger" onClick={() => setAsking(true)}>
        Leave {glider.name} …
      </Button>
      <Dialog
        open={asking}
        onOpenChange={setAsking}
        title={`Leave ${glider.name}?`}
        description="You will see it again only when its owner invites you again."
      >
        {leave.error && (
          <Notice tone="red" live>
            {leave.error.message}
          </Notice>
        )}
        <DialogActions>
          <Button onClick={() => setAsking(false)}>Stay</Button>
          <Button variant="danger" onClick={confirm} pending={leave.isPending} pendingText="Leaving …">
            Leave it
          </Button>
        </DialogActions>
      </Dialog>
    </Part>
  );
}
