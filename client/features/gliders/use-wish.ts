import { useRef } from 'react';

/** A key per wish to make something: the same on every retry, a new one once it was granted. */
export function useWish(): { current: () => string; granted: () => void } {
  const key = useRef<string | null>(null);
  return {
    current: () => (key.current ??= crypto.randomUUID()),
    granted: () => {
      key.current = null;
    },
  };
}
