import { useState } from 'react';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { ApiError } from '#client/lib/api.ts';
import { accountDeletionInput, type AccountDto } from '#shared/schemas/account.ts';
import { Part } from './part.tsx';
import { deleteAccount } from './queries.ts';

export interface DeletionLinks {
  /** where the members of a glider are seen to */
  sharingHref: (gliderId: string) => string;
}

interface DeletionPartProps extends DeletionLinks {
  account: AccountDto;
  onDeleted: () => void;
}

interface Named {
  id: string;
  name: string;
}

/** Ends the account; what goes, what stays and what has to be done first is said before. */
export function DeletionPart({ account, sharingHref, onDeleted }: DeletionPartProps) {
  const [asking, setAsking] = useState(false);
  return (
    <Part title="Delete the account" note="For good. Download everything first if you may want it again.">
      <ul className="list-disc space-y-1 pl-5">
        <li>
          Gliders that are yours alone go with all their states, sheets and photos, and their links show
          nothing any more.
        </li>
        <li>
          Gliders of yours that others are members of stop the deletion: hand them over first, or remove the
          members.
        </li>
        <li>
          Gliders of others stay with them. In their logs you become “Former member”; sheets keep the name
          they were made with.
        </li>
        <li>Your own materials and your choices go; every browser is signed out.</li>
      </ul>
      <Button variant="danger" className="mt-4" onClick={() => setAsking(true)}>
        Delete the account …
      </Button>
      {asking && (
        <DeletionDialog
          account={account}
          sharingHref={sharingHref}
          onDeleted={onDeleted}
          onClose={() => setAsking(false)}
        />
      )}
    </Part>
  );
}

function DeletionDialog({
  account,
  sharingHref,
  onDeleted,
  onClose,
}: DeletionPartProps & { onClose: () => void }) {
  const [stopping, setStopping] = useState<readonly Named[]>([]);
  const say = useToast();
  const { form, field, root, pending } = useSmallForm<{ password: string }>({
    names: ['password'],
    schema: () => Promise.resolve(accountDeletionInput),
    send: async ({ password }) => {
      setStopping([]);
      try {
        const { deleted } = await deleteAccount(password);
        say(
          `The account is deleted${deleted.length === 0 ? '.' : `, and ${gliderCount(deleted.length)} with it.`}`,
        );
        onDeleted();
      } catch (error) {
        setStopping(stoppedBy(error));
        throw error;
      }
    },
  });
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Delete the account of ${account.name}?`}
      description={`${gliderCount(account.gliders.owned)} of your own would go. This cannot be undone.`}
    >
      <form {...form}>
        {root && (
          <Notice tone="red" live className="mb-3">
            {root}
          </Notice>
        )}
        {stopping.length > 0 && (
          <ul className="mb-3 list-disc pl-5">
            {stopping.map(({ id, name }) => (
              <li key={id}>
                <Link to={sharingHref(id)} className="link">
                  {name}
                </Link>
              </li>
            ))}
          </ul>
        )}
        <TextField
          {...field('password')}
          label="Your password"
          type="password"
          autoComplete="current-password"
        />
        <DialogActions>
          <Button onClick={onClose}>Keep the account</Button>
          <Button type="submit" variant="danger" pending={pending} pendingText="Deleting …">
            Delete for good
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

const shared = z.array(z.object({ id: z.string(), name: z.string() }));

/** The gliders that have to be handed over first. */
function stoppedBy(error: unknown): readonly Named[] {
  if (!(error instanceof ApiError) || error.code !== 'shared_gliders') return [];
  const gliders = shared.safeParse(error.problem['gliders']);
  return gliders.success ? gliders.data : [];
}

function gliderCount(count: number): string {
  return count === 1 ? '1 glider' : `${count} gliders`;
}
