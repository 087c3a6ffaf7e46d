import { useRef, type PointerEvent } from 'react';
import type { Point } from '#shared/drawing/shape.ts';

interface DragHandlers {
  /** Pressed and let go at one place, px of the drawing's element. */
  onPress: (at: Point) => void;
  onHover: (at: Point | null) => void;
  onDrag: (dx: number, dy: number) => void;
}

/** Farther than this, px, and a press is a drag. */
const STILL = 4;

/** Tells a press from a drag. */
export function useDrag({ onPress, onHover, onDrag }: DragHandlers) {
  const start = useRef<{ id: number; x: number; y: number; last: Point; moved: boolean } | null>(null);
  const placeOf = (event: PointerEvent): Point => {
    const box = event.currentTarget.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      const { pointerId: id, clientX: x, clientY: y } = event;
      start.current = { id, x, y, last: [x, y], moved: false };
    },
    onPointerMove: (event: PointerEvent) => {
      // Let go outside, where nobody told us.
      if (event.buttons === 0) start.current = null;
      const { current } = start;
      if (!current) {
        if (event.pointerType !== 'touch') onHover(placeOf(event));
        return;
      }
      if (current.id !== event.pointerId) return;
      if (Math.hypot(event.clientX - current.x, event.clientY - current.y) > STILL) {
        if (!current.moved) event.currentTarget.setPointerCapture(event.pointerId);
        current.moved = true;
      }
      if (current.moved) onDrag(event.clientX - current.last[0], event.clientY - current.last[1]);
      current.last = [event.clientX, event.clientY];
    },
    onPointerUp: (event: PointerEvent) => {
      const pressed = start.current?.id === event.pointerId && !start.current.moved;
      start.current = null;
      if (pressed) onPress(placeOf(event));
    },
    onPointerCancel: () => {
      start.current = null;
    },
    onPointerLeave: () => onHover(null),
  };
}
