import { useEffect, useRef, useState, type RefObject } from 'react';

/**
 * Whether an element lies in the window or within `margin` px of it. True until the browser has looked, and where it
 * cannot tell. `of` names the element that the ref stands for, so that another in its place is looked at anew.
 */
export function useNear<T extends HTMLElement>(of: string, margin: number): [RefObject<T | null>, boolean] {
  const ref = useRef<T>(null);
  const [near, setNear] = useState(true);
  useEffect(() => {
    const element = ref.current;
    if (!element || typeof IntersectionObserver === 'undefined') return;
    const observer = new IntersectionObserver((entries) => setNear(entries.at(-1)?.isIntersecting ?? true), {
      rootMargin: `${margin}px 0px`,
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [of, margin]);
  return [ref, near];
}
