import { useLayoutEffect, useRef, type FocusEvent } from 'react';
import type { FocusWish } from './focus-wish.ts';

interface HeldFocus {
  onFocus: (event: FocusEvent) => void;
  onBlur: () => void;
}

/**
 * Sees to it that the focus does not fall off a list when an undo, or somebody else's change, takes away the row that
 * holds it: it goes to whatever stands in that place now. `lines` are those of the rows, in order.
 */
export function useHeldFocus(lines: () => readonly string[], wish: FocusWish): HeldFocus {
  const held = useRef<{ line: string; at: number } | null>(null);
  // Before the wishes are granted, which is done after the page is shown.
  useLayoutEffect(() => {
    if (held.current === null || document.activeElement !== document.body) return;
    const { line, at } = held.current;
    held.current = null;
    const all = lines();
    if (!wish.asked()) wish.ask(all.includes(line) ? line : (all[at] ?? all.at(-1) ?? null), 'row');
  });
  return {
    onFocus: ({ target }) => {
      const line = target.closest<HTMLElement>('[data-line]')?.dataset['line'];
      held.current = line === undefined ? null : { line, at: lines().indexOf(line) };
    },
    // Not told when the element itself is taken out of the page.
    onBlur: () => {
      held.current = null;
    },
  };
}
