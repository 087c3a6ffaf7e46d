import { useEffect, useRef, useState, type ReactNode } from 'react';

/** How far below the screen something is fetched, so that it is there when it is scrolled to. */
const AHEAD = '400px';

/** Shows what takes long to fetch once the reader is near it; until then what stands in its place. */
export function WhenNear({ before, children }: { before: ReactNode; children: ReactNode }) {
  const place = useRef<HTMLDivElement>(null);
  const [near, setNear] = useState(typeof IntersectionObserver === 'undefined');
  useEffect(() => {
    const element = place.current;
    if (near || !element) return;
    const observer = new IntersectionObserver(
      (entries) => {
        if (entries.some(({ isIntersecting }) => isIntersecting)) setNear(true);
      },
      { rootMargin: AHEAD },
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, [near]);
  return near ? children : <div ref={place}>{before}</div>;
}
