import { cn } from '#client/lib/cn.ts';

/** What can be done with a row as a whole. Always the same object, so that rows do not render for it. */
export interface RowOps {
  pick: (line: string | null) => void;
  /** closes the form and gives the focus back to its row */
  close: (line: string) => void;
  copy: (id: string) => void;
  move: (id: string, by: 1 | -1) => void;
  remove: (id: string) => void;
}

interface RowToolsProps {
  id: string;
  name: string;
  ops: RowOps;
  first: boolean;
  last: boolean;
}

const TOOL =
  'inline-flex min-h-row items-center rounded-md px-2 text-note font-semibold text-ink hover:bg-ink-wash ' +
  'aria-disabled:text-graphite aria-disabled:opacity-60 aria-disabled:hover:bg-transparent';

/** Copy, order, removal. At the ends the arrows are dimmed but stay, so that the focus does not fall off them. */
export function RowTools({ id, name, ops, first, last }: RowToolsProps) {
  return (
    <div className="mt-2 flex flex-wrap gap-x-1 border-t border-rule pt-2">
      <button type="button" className={TOOL} onClick={() => ops.copy(id)}>
        Copy
      </button>
      <button
        type="button"
        data-move="up"
        aria-label={`Move ${name} up`}
        aria-disabled={first}
        className={TOOL}
        onClick={() => !first && ops.move(id, -1)}
      >
        ↑ Up
      </button>
      <button
        type="button"
        data-move="down"
        aria-label={`Move ${name} down`}
        aria-disabled={last}
        className={TOOL}
        onClick={() => !last && ops.move(id, 1)}
      >
        ↓ Down
      </button>
      <button type="button" className={cn(TOOL, 'ml-auto')} onClick={() => ops.remove(id)}>
        Remove
      </button>
    </div>
  );
}
