import { useLayoutEffect, useRef } from 'react';
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
  const up = useRef<HTMLButtonElement>(null);
  const down = useRef<HTMLButtonElement>(null);
  const moved = useRef<HTMLButtonElement | null>(null);
  // Moving a row takes its element out of the page for a moment, and the focus with it.
  useLayoutEffect(() => {
    moved.current?.focus();
    moved.current = null;
  });
  const move = (by: 1 | -1, stays: boolean, button: HTMLButtonElement | null) => {
    if (stays) return;
    moved.current = button;
    ops.move(id, by);
  };
  return (
    <div className="mt-2 flex flex-wrap gap-x-1 border-t border-rule pt-2">
      <button type="button" className={TOOL} onClick={() => ops.copy(id)}>
        Copy
      </button>
      <button
        ref={up}
        type="button"
        aria-label={`Move ${name} up`}
        aria-disabled={first}
        className={TOOL}
        onClick={() => move(-1, first, up.current)}
      >
        ↑ Up
      </button>
      <button
        ref={down}
        type="button"
        aria-label={`Move ${name} down`}
        aria-disabled={last}
        className={TOOL}
        onClick={() => move(1, last, down.current)}
      >
        ↓ Down
      </button>
      <button type="button" className={cn(TOOL, 'ml-auto')} onClick={() => ops.remove(id)}>
        Remove
      </button>
    </div>
  );
}
