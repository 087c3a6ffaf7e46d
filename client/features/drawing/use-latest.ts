import { useCallback, useEffect, useRef } from 'react';

/** The same function for ever, which does what the latest one does; so that drawings need not render for it. */
export function useLatest<F extends (...args: never[]) => unknown>(fn: F): (...args: Parameters<F>) => void {
  const latest = useRef(fn);
  useEffect(() => {
    latest.current = fn;
  });
  return useCallback((...args: Parameters<F>) => void latest.current(...args), []);
}
