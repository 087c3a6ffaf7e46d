import { useEffect, useState } from 'react';

/** True once `active` has lasted for `ms`, so that what is quick never flashes a placeholder. */
export function useDelayed(active: boolean, ms = 250): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    if (!active) return;
    const timer = setTimeout(() => setLate(true), ms);
    return () => {
      clearTimeout(timer);
      setLate(false);
    };
  }, [active, ms]);
  return active && late;
}
