import { useLayoutEffect, useRef, useState, type RefObject } from 'react';

/**
 * Width of an element in CSS px, for drawings that lay themselves out; `before` until it has been shown and
 * measured.
 */
export function useWidth<T extends HTMLElement>(before = 960): [RefObject<T | null>, number] {
  const ref = useRef<T>(null);
  const [width, setWidth] = useState(before);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => {
      if (element.clientWidth > 0) setWidth(element.clientWidth);
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
