import { useCallback, useEffect, useRef } from 'react';

/** How long a field is waited for that its page has still to show, ms. */
const PATIENCE = 3_000;
const EVERY = 60;

/** Takes the reader to a field by its label, as soon as the page shows it; `before` runs once it is found. */
export function useFieldWish(): (label: string, before?: () => void) => void {
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  return useCallback((label: string, before?: () => void) => {
    const until = Date.now() + PATIENCE;
    const look = () => {
      const found = fieldOf(label);
      if (found) {
        before?.();
        // What `before` changes is shown first: the form that it shuts must not take the focus away.
        timer.current = setTimeout(() => arrive(label), EVERY);
      } else if (Date.now() < until) {
        timer.current = setTimeout(look, EVERY);
      }
    };
    clearTimeout(timer.current);
    timer.current = setTimeout(look, EVERY);
  }, []);
}

function arrive(label: string): void {
  const field = fieldOf(label);
  const folded = field?.closest('details');
  if (folded) folded.open = true;
  field?.scrollIntoView({ block: 'center' });
  field?.focus({ preventScroll: true });
}

/** The control of a label, or of the first of its cells: `Width` is also `Width, root`. */
function fieldOf(label: string): HTMLElement | null {
  const labels = [...document.querySelectorAll<HTMLLabelElement>('main label')];
  const text = (one: HTMLLabelElement) => one.textContent.trim();
  const found =
    labels.find((one) => text(one) === label) ?? labels.find((one) => text(one).startsWith(`${label}, `));
  return found?.control instanceof HTMLElement ? found.control : null;
}
