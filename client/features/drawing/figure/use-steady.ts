import { useState } from 'react';
import { same } from '#client/lib/same.ts';

/** The value, as the very object it was before while it says the same. */
export function useSteady<T>(value: T): T {
  const [kept, setKept] = useState(value);
  if (same(kept, value)) return kept;
  setKept(value);
  return value;
}
