import { useSyncExternalStore } from 'react';

/** Steps, px, so that a phone's address bar coming and going redraws nothing. */
const STEP = 80;

function subscribe(listener: () => void): () => void {
  addEventListener('resize', listener);
  return () => removeEventListener('resize', listener);
}

/** Height of the window in coarse steps, for drawings that share it with a list. */
export function useViewportHeight(): number {
  return useSyncExternalStore(subscribe, () => Math.round(innerHeight / STEP) * STEP);
}
