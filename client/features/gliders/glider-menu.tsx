import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Menu, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderDto, GliderSummaryDto } from '#shared/schemas/glider.ts';
import { DeleteDialog } from './delete-dialog.tsx';
import { useCreateGlider } from './mutations.ts';
import { copyName, downloadPlan } from './plan-file.ts';
import { gliderQueries } from './queries.ts';
import { useWish } from './use-wish.ts';

interface GliderMenuProps {
  glider: GliderSummaryDto;
  /** names that a copy must not take again */
  taken: readonly string[];
}

/** What can be done with a glider from the bench. */
export function GliderMenu({ glider, taken }: GliderMenuProps) {
  const client = useQueryClient();
  const create = useCreateGlider();
  const wish = useWish();
  const say = useToast();
  const [deleting, setDeleting] = useState(false);

  const withPlan = (use: (full: GliderDto) => void) => {
    client.fetchQuery(gliderQueries.detail(glider.id)).then(use, (error: Error) => say(error.message));
  };
  const copy = () =>
    withPlan(({ plan }) =>
      create.mutate(
        { plan: { ...plan, name: copyName(plan.name, taken) }, wish: wish.current() },
        {
          onSuccess: ({ name }) => {
            wish.granted();
            say(`${name} lies on the bench.`);
          },
          onError: (error) => say(error.message),
        },
      ),
    );

  return (
    <>
      <Menu
        trigger={
          <button
            type="button"
            aria-label={`Actions for ${glider.name}`}
            className="inline-grid size-row place-items-center rounded-md text-graphite hover:bg-ink-wash hover:text-ink"
          >
            <svg viewBox="0 0 16 4" width="16" height="4" aria-hidden="true" fill="currentColor">
              <circle cx="2" cy="2" r="1.6" />
              <circle cx="8" cy="2" r="1.6" />
              <circle cx="14" cy="2" r="1.6" />
            </svg>
          </button>
        }
      >
        <MenuItem onSelect={copy}>Copy</MenuItem>
        <MenuItem onSelect={() => withPlan(({ plan }) => downloadPlan(plan))}>Download the plan</MenuItem>
        {glider.role === 'owner' && (
          <>
            <MenuLine />
            <MenuItem danger onSelect={() => setDeleting(true)}>
              Delete …
            </MenuItem>
          </>
        )}
      </Menu>
      <DeleteDialog glider={glider} open={deleting} onOpenChange={setDeleting} />
    </>
  );
}
