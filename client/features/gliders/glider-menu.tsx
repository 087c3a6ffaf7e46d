import { useState, type ComponentProps } from 'react';
import { useNavigate } from 'react-router-dom';
import { Menu, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { exportPlans } from './bench-export.ts';
import { useArchiveGliders, useCopyGliders } from './bench-queries.ts';
import { DeleteDialog } from './delete-dialog.tsx';
import { useWish } from './use-wish.ts';

interface GliderMenuProps {
  glider: GliderSummaryDto;
  sharingHref: string;
}

/** What can be done with a glider from the bench; a long bench makes each menu only when it is reached for. */
export function GliderMenu(props: GliderMenuProps) {
  const [wanted, setWanted] = useState(false);
  const [deleting, setDeleting] = useState(false);
  const { glider } = props;
  return (
    <>
      {wanted ? (
        <Opened {...props} onDelete={() => setDeleting(true)} />
      ) : (
        <Dots name={glider.name} onWanted={() => setWanted(true)} />
      )}
      {deleting && <DeleteDialog glider={glider} open onOpenChange={setDeleting} />}
    </>
  );
}

function Opened({ glider, sharingHref, onDelete }: GliderMenuProps & { onDelete: () => void }) {
  const { id, name, role } = glider;
  const copies = useCopyGliders();
  const archive = useArchiveGliders();
  const navigate = useNavigate();
  const wish = useWish();
  const say = useToast();
  const told = (error: Error) => say(error.message);
  const archived = glider.archivedAt !== null;

  // The row may be gone before the answer is there, so what is said does not hang on it.
  const copy = () =>
    void copies.mutateAsync({ ids: [id], wish: wish.current() }).then(([made]) => {
      wish.granted();
      say(`${made?.name ?? 'The copy'} lies on the bench.`);
    }, told);
  const putAway = () =>
    void archive
      .mutateAsync({ ids: [id], archived: !archived })
      .then(() => say(archived ? `${name} is back in use.` : `${name} is put away.`), told);

  return (
    <Menu defaultOpen trigger={<Dots name={name} />}>
      <MenuItem onSelect={copy}>Copy</MenuItem>
      <MenuItem onSelect={() => void exportPlans([glider]).catch(told)}>Download the plan</MenuItem>
      <MenuItem onSelect={() => void navigate(sharingHref)}>
        {role === 'owner' ? 'Share …' : 'Members …'}
      </MenuItem>
      {role === 'owner' && (
        <>
          <MenuItem onSelect={putAway}>{archived ? 'Back into use' : 'Archive'}</MenuItem>
          <MenuLine />
          <MenuItem danger onSelect={onDelete}>
            Delete …
          </MenuItem>
        </>
      )}
    </Menu>
  );
}

interface DotsProps extends ComponentProps<'button'> {
  name: string;
  onWanted?: () => void;
}

function Dots({ name, onWanted, ...rest }: DotsProps) {
  return (
    <button
      type="button"
      aria-label={`Actions for ${name}`}
      aria-haspopup="menu"
      onClick={onWanted}
      onKeyDown={(event) => {
        if (event.key === 'ArrowDown' && onWanted) {
          event.preventDefault();
          onWanted();
        }
      }}
      className="inline-grid size-row place-items-center rounded-md text-graphite hover:bg-ink-wash hover:text-ink"
      {...rest}
    >
      <svg viewBox="0 0 16 4" width="16" height="4" aria-hidden="true" fill="currentColor">
        <circle cx="2" cy="2" r="1.6" />
        <circle cx="8" cy="2" r="1.6" />
        <circle cx="14" cy="2" r="1.6" />
      </svg>
    </button>
  );
}
