import { useRef } from 'react';
import { lineAt, targetsOf, type Target } from '#shared/drawing/hit.ts';
import type { Point, Shape } from '#shared/drawing/shape.ts';

/** Finds what is drawn at a place, mm. The drawing is made ready for it only once something is pointed at. */
export function useTargets(shapes: readonly Shape[]): (at: Point, reach: number) => string | null {
  const made = useRef<{ shapes: readonly Shape[]; targets: Target[] } | null>(null);
  return (at, reach) => {
    if (made.current?.shapes !== shapes) made.current = { shapes, targets: targetsOf(shapes) };
    return lineAt(made.current.targets, at, reach);
  };
}
