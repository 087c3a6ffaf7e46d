import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import type { Point } from '#shared/drawing/shape.ts';

interface Gestures {
  /** Pressed and let go at one place, px of the drawing. */
  onPress: (at: Point) => void;
  onHover: (at: Point | null) => void;
  /** Pushed, px. */
  onPan?: ((dx: number, dy: number) => void) | undefined;
  /** Made larger by a factor about a place; false where there is no going further, so that the page may scroll. */
  onZoom?: ((by: number, at: Point) => boolean) | undefined;
}

/** Farther than this, px, and a press is a drag. */
const STILL = 4;
/** Larger by this factor for each px that a wheel turns. */
const PER_PX = 1.0022;
/** One click of a wheel that counts lines, px. */
const LINE = 33;
/** While the page scrolls under the pointer, and so long after, the wheel goes on scrolling, ms. */
const SCROLLING = 350;

const placeIn = (element: Element, x: number, y: number): Point => {
  const box = element.getBoundingClientRect();
  return [x - box.left, y - box.top];
};

interface Held {
  x: number;
  y: number;
}

/** Presses, pushes, pinches and the wheel, told apart. */
export function useGestures(ref: RefObject<HTMLElement | null>, gestures: Gestures) {
  const latest = useRef(gestures);
  const held = useRef(new Map<number, Held>());
  const moved = useRef(false);
  useEffect(() => {
    latest.current = gestures;
  });
  useWheel(ref, latest);
  useFingers(ref);

  const release = (event: PointerEvent) => {
    const pressed = held.current.size === 1 && held.current.has(event.pointerId) && !moved.current;
    held.current.delete(event.pointerId);
    if (held.current.size === 0) moved.current = false;
    return pressed;
  };
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      held.current.set(event.pointerId, { x: event.clientX, y: event.clientY });
      if (held.current.size > 1) moved.current = true;
    },
    onPointerMove: (event: PointerEvent) => {
      // Let go outside, where nobody told us.
      if (event.buttons === 0) held.current.clear();
      const before = held.current.get(event.pointerId);
      const { onPan, onZoom, onHover } = latest.current;
      if (!before) {
        if (event.pointerType !== 'touch')
          onHover(placeIn(event.currentTarget, event.clientX, event.clientY));
        return;
      }
      const [dx, dy] = [event.clientX - before.x, event.clientY - before.y];
      if (!moved.current && Math.hypot(dx, dy) <= STILL) return;
      if (!moved.current) event.currentTarget.setPointerCapture(event.pointerId);
      moved.current = true;
      const other = [...held.current].find(([id]) => id !== event.pointerId)?.[1];
      held.current.set(event.pointerId, { x: event.clientX, y: event.clientY });
      if (!other) {
        onPan?.(dx, dy);
        return;
      }
      // Two fingers: each carries half of the push, and what grows between them is the zoom.
      onPan?.(dx / 2, dy / 2);
      const apart = Math.hypot(before.x - other.x, before.y - other.y);
      const now = Math.hypot(event.clientX - other.x, event.clientY - other.y);
      const middle = placeIn(
        event.currentTarget,
        (event.clientX + other.x) / 2,
        (event.clientY + other.y) / 2,
      );
      if (apart > 0) onZoom?.(now / apart, middle);
    },
    onPointerUp: (event: PointerEvent) => {
      if (release(event)) latest.current.onPress(placeIn(event.currentTarget, event.clientX, event.clientY));
    },
    onPointerCancel: release,
    onPointerLeave: () => latest.current.onHover(null),
  };
}

/** The wheel makes the drawing larger or smaller, unless it was turned to scroll the page and that still runs. */
function useWheel(ref: RefObject<HTMLElement | null>, latest: RefObject<Gestures>): void {
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    let scrolled = -Infinity;
    const onScroll = () => {
      scrolled = performance.now();
    };
    const onWheel = (event: WheelEvent) => {
      const { onZoom } = latest.current;
      if (!onZoom) return;
      const pinch = event.ctrlKey || event.metaKey;
      if (!pinch && event.timeStamp - scrolled < SCROLLING) return;
      const px = event.deltaY * (event.deltaMode === WheelEvent.DOM_DELTA_LINE ? LINE : 1) * (pinch ? 4 : 1);
      const done = onZoom(PER_PX ** -px, placeIn(element, event.clientX, event.clientY));
      if (done || pinch) event.preventDefault();
    };
    element.addEventListener('wheel', onWheel, { passive: false });
    addEventListener('scroll', onScroll, { passive: true });
    return () => {
      element.removeEventListener('wheel', onWheel);
      removeEventListener('scroll', onScroll);
    };
  }, [ref, latest]);
}

/** Two fingers on the drawing belong to the drawing, not to the page. */
function useFingers(ref: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const onTouchMove = (event: TouchEvent) => {
      if (event.touches.length > 1 && event.cancelable) event.preventDefault();
    };
    element.addEventListener('touchmove', onTouchMove, { passive: false });
    return () => element.removeEventListener('touchmove', onTouchMove);
  }, [ref]);
}
