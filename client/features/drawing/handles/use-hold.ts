import { useEffect, useRef, useState, type PointerEvent } from 'react';
import { HELD, type Workspace } from '#client/lib/workspace.ts';
import type { Point } from '#shared/drawing/shape.ts';
import { aimed, type Axis, type Handle } from './handle.ts';

export interface HoldOptions {
  edit: Workspace['edit'];
  undo: () => void;
  /** px per mm */
  scale: number;
  /** which way the span runs on the screen */
  sign: 1 | -1;
  /** one step of the reader's unit, mm */
  step: number;
  /** told when something is taken hold of and let go, so that the paper stays as it is meanwhile */
  onHold: (holding: boolean) => void;
}

/** Farther than this, px, and it is known which way a handle is pulled. */
const DECIDED = 4;
/** How near to a mark a handle falls onto it, px. */
const NEAR = 5;
let holds = 0;

interface Hold {
  handle: Handle;
  from: Point;
  axis: Axis | null;
  last: number | null;
  /** name of the change: one hold is one step back, however long it takes */
  what: string;
}

/** Pulls handles by the pointer: the plan follows live, Escape lets it spring back. */
export function useHold(options: HoldOptions) {
  const latest = useRef(options);
  useEffect(() => {
    latest.current = options;
  });
  const hold = useRef<Hold | null>(null);
  const [held, setHeld] = useState<{ id: string; axis: Axis | null } | null>(null);

  const end = () => {
    hold.current = null;
    setHeld(null);
    latest.current.onHold(false);
  };
  useEffect(() => {
    if (held === null) return;
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      event.preventDefault();
      event.stopPropagation();
      if (hold.current?.last !== null) latest.current.undo();
      end();
    };
    addEventListener('keydown', onKeyDown, true);
    return () => removeEventListener('keydown', onKeyDown, true);
  });

  const begin = (event: PointerEvent, handle: Handle) => {
    if (event.button !== 0) return;
    event.stopPropagation();
    event.currentTarget.setPointerCapture(event.pointerId);
    holds += 1;
    const what = `${HELD}${holds}: ${handle.name}`;
    hold.current = { handle, from: [event.clientX, event.clientY], axis: null, last: null, what };
    setHeld({ id: handle.id, axis: null });
    latest.current.onHold(true);
  };
  const pull = (event: PointerEvent) => {
    const { current } = hold;
    if (!current) return;
    event.stopPropagation();
    const { scale, sign, step, edit } = latest.current;
    const pulled = {
      s: (sign * (event.clientX - current.from[0])) / scale,
      x: (event.clientY - current.from[1]) / scale,
    };
    if (current.axis === null) {
      current.axis = axisOf(current.handle, pulled, DECIDED / scale);
      if (current.axis === null) return;
      setHeld({ id: current.handle.id, axis: current.axis });
    }
    const reach = current.handle.reach[current.axis];
    if (!reach) return;
    const value = aimed(reach, reach.value + pulled[current.axis], step, NEAR / scale);
    if (value === (current.last ?? reach.value)) return;
    current.last = value;
    edit(reach.set(value), current.what);
  };
  const letGo = (event: PointerEvent) => {
    if (!hold.current) return;
    event.stopPropagation();
    end();
  };
  return { held, begin, pull, letGo };
}

/** The way in which a handle is pulled most, of those that it can go. */
function axisOf({ reach }: Handle, pulled: Record<Axis, number>, decided: number): Axis | null {
  const [s, x] = [reach.s ? Math.abs(pulled.s) : 0, reach.x ? Math.abs(pulled.x) : 0];
  if (Math.max(s, x) < decided) return null;
  return s >= x ? 's' : 'x';
}
