import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { MemberDto } from '#shared/schemas/sharing.ts';
import { useHandOver } from './mutations.ts';
import { Part } from './part.tsx';

interface HandOverProps {
  glider: GliderDto;
  members: readonly MemberDto[];
}

/** Makes a member the owner; whoever hands over stays as a builder. */
export function HandOver({ glider, members }: HandOverProps) {
  const others = members.filter(({ you }) => !you);
  const [chosen, setChosen] = useState<string | null>(null);
  const [asking, setAsking] = useState(false);
  const heir = others.find(({ userId }) => userId === chosen) ?? others[0];
  return (
    <Part
      title="Hand it over"
      note="A member becomes the owner, who alone shares, archives and deletes it. You stay as a builder and can be removed."
    >
      {heir ? (
        <div className="flex flex-wrap items-end gap-3">
          <div className="w-64 max-w-full">
            <Select
              label="New owner"
              keepRoom={false}
              value={heir.userId}
              options={others.map(({ userId, name }) => ({ value: userId, label: name }))}
              onValue={setChosen}
            />
          </div>
          <Button variant="danger" onClick={() => setAsking(true)}>
            Hand over …
          </Button>
          {asking && <HandOverDialog glider={glider} heir={heir} onClose={() => setAsking(false)} />}
        </div>
      ) : (
        <p>Invite somebody first: only a member can become the owner.</p>
      )}
    </Part>
  );
}

interface HandOverDialogProps {
  glider: GliderDto;
  heir: MemberDto;
  onClose: () => void;
}

function HandOverDialog({ glider, heir, onClose }: HandOverDialogProps) {
  const handOver = useHandOver(glider.id);
  const say = useToast();
  const confirm = () =>
    void handOver.mutateAsync(heir.userId).then(
      () => {
        onClose();
        say(`${heir.name} owns ${glider.name} now; you are one of its builders.`);
      },
      () => undefined,
    );
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Hand ${glider.name} over to ${heir.name}?`}
      description="You cannot take it back yourself; only the new owner can hand it on."
    >
      {handOver.error && (
        <Notice tone="red" live>
          {handOver.error.message}
        </Notice>
      )}
      <DialogActions>
        <Button onClick={onClose}>Keep it</Button>
        <Button variant="danger" onClick={confirm} pending={handOver.isPending} pendingText="Handing over …">
          Hand over
        </Button>
      </DialogActions>
    </Dialog>
  );
}
