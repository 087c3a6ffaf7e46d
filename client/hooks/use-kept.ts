import { useState } from 'react';
import type { z } from 'zod';

/**
 * A value kept in this browser under a key, so that it is there at the next visit. What is not there, or does not fit
 * the schema, is the value to begin with. Where storage is refused it holds until the page is left.
 */
export function useKept<T>(key: string, schema: z.ZodType<T>, initial: T): [T, (value: T) => void] {
  const [held, setHeld] = useState(() => ({ key, value: stored(key, schema) ?? initial }));
  const value = held.key === key ? held.value : (stored(key, schema) ?? initial);
  if (held.key !== key) setHeld({ key, value });
  return [
    value,
    (next) => {
      setHeld({ key, value: next });
      try {
        localStorage.setItem(key, JSON.stringify(next));
      } catch {
        // Nothing is lost that was not going to be.
      }
    },
  ];
}

function stored<T>(key: string, schema: z.ZodType<T>): T | null {
  try {
    const text = localStorage.getItem(key);
    return text === null ? null : (schema.safeParse(JSON.parse(text)).data ?? null);
  } catch {
    return null;
  }
}
