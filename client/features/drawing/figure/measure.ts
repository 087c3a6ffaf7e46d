import { useState } from 'react';
import { formatInchFraction } from '#shared/format/inches.ts';
import { formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Point } from '#shared/drawing/shape.ts';
import type { PlanViewName } from './drawings.ts';

/** Two places between which is measured; the second follows the pointer until it is put down. */
export interface Measuring {
  first: Point | null;
  second: Point | null;
  done: boolean;
}
const NOTHING: Measuring = { first: null, second: null, done: false };

/** Puts a place down: the first, the second, or the first of a new pair. */
function put({ first, done }: Measuring, at: Point): Measuring {
  return first && !done ? { first, second: at, done: true } : { first: at, second: at, done: false };
}

export interface Measure {
  on: boolean;
  state: Measuring;
  /** where the next press would go */
  aim: Point | null;
  put: (at: Point) => void;
  aimAt: (at: Point) => void;
  /** takes the line away, or, where there is none, lays the tool down */
  back: () => void;
}

/** Measuring between two places of a drawing, mm, while the tool is in hand. */
export function useMeasure(on: boolean, layDown: () => void): Measure {
  const [state, setState] = useState<Measuring>(NOTHING);
  const [aim, setAim] = useState<Point | null>(null);
  const clear = () => {
    setState(NOTHING);
    setAim(null);
  };
  const [wasOn, setWasOn] = useState(on);
  if (wasOn !== on) {
    setWasOn(on);
    clear();
  }
  return {
    on,
    state,
    aim,
    put: (at) => {
      setAim(at);
      setState((now) => put(now, at));
    },
    aimAt: (at) => {
      setAim(at);
      setState((now) => (now.first && !now.done ? { ...now, second: at } : now));
    },
    back: () => {
      if (state.first === null) layDown();
      clear();
    },
  };
}

/** Names of a view's two directions. */
const DIRECTIONS: Record<PlanViewName | 'section', readonly [string, string]> = {
  half: ['aft', 'along the span'],
  whole: ['aft', 'across'],
  side: ['aft', 'up'],
  front: ['across', 'up'],
  section: ['aft', 'up'],
};

/** The nearest sixty-fourth of an inch, as a rule reads. */
export function nearestFraction(lengthMm: number): string {
  const parts = Math.round((lengthMm / 25.4) * 64);
  return `${formatInchFraction((parts / 64) * 25.4) ?? '0'}${NARROW_SPACE}in`;
}

const mm = (value: number) => formatQuantity(value, 'length', { unit: 'mm' });

/** A measured length both ways, and its two directions: `142.3 mm, 5 39/64 in; 12.0 mm aft, 141.8 mm along the span`. */
export function measureWords(
  view: PlanViewName | 'section',
  first: Point,
  second: Point,
): { short: string; whole: string } {
  const [a, b] = [Math.abs(second[0] - first[0]), Math.abs(second[1] - first[1])];
  const length = Math.hypot(a, b);
  const [one, other] = DIRECTIONS[view];
  const short = `${mm(length)} · ${nearestFraction(length)}`;
  return { short, whole: `${mm(length)}, ${nearestFraction(length)}; ${mm(a)} ${one}, ${mm(b)} ${other}` };
}
