import { useId, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';
import type { Laid } from '#client/components/drawing/sheet.ts';
import type { Point } from '#shared/drawing/shape.ts';
import type { Measure } from './measure.ts';
import { useGestures } from './use-gestures.ts';

interface DrawingFrameProps {
  paper: Laid;
  /** id of the figure's heading, which names what the keys act on */
  labelId: string;
  /** the drawing in a sentence */
  sentence: string;
  /** it is larger than its paper: a finger pushes it instead of the page */
  larger: boolean;
  measure: Measure;
  /** one step of the measuring cross by the arrow keys, mm */
  step: number;
  /** px of the drawing to mm and back */
  toDrawing: (at: Point) => Point;
  fromDrawing: (at: Point) => Point;
  /** where a measuring press falls */
  snap: (at: Point) => Point;
  onPress: (at: Point) => void;
  onHover: (at: Point | null) => void;
  onPan?: (dx: number, dy: number) => void;
  onZoom?: (by: number, at: Point) => boolean;
  onFit?: () => void;
  children: ReactNode;
  /** what is laid over the drawing and has controls of its own */
  overlay?: ReactNode;
}

/** One press of an arrow key pushes the drawing so far, px. */
const PUSH = 48;
const ARROWS: Record<string, readonly [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const HELP =
  'Plus and minus make the drawing larger and smaller, 0 fits it, arrow keys push it. While measuring, arrow keys move the cross and Enter puts a point down.';

/** A drawing that can be pointed at, pushed, made larger and measured in, by pointer, touch and keyboard. */
export function DrawingFrame(props: DrawingFrameProps) {
  const { paper, measure, larger, toDrawing, fromDrawing, snap, onZoom, onPan, step } = props;
  const frame = useRef<HTMLDivElement>(null);
  const id = useId();
  const gestures = useGestures(frame, {
    onPress: (at) => {
      frame.current?.focus({ preventScroll: true });
      if (measure.on) measure.put(snap(toDrawing(at)));
      else props.onPress(at);
    },
    onHover: (at) => {
      if (measure.on && at) measure.aimAt(snap(toDrawing(at)));
      props.onHover(measure.on ? null : at);
    },
    onPan,
    onZoom,
  });

  const onArrow = ([dx, dy]: readonly [number, number], far: boolean): boolean => {
    if (measure.on) {
      const place = fromDrawing(measure.aim ?? toDrawing(paper.middle));
      const by = step * (far ? 10 : 1) * paper.sheet.scale;
      measure.aimAt(toDrawing([place[0] + dx * by, place[1] + dy * by]));
      return true;
    }
    if (!larger || !onPan) return false;
    onPan(-dx * PUSH, -dy * PUSH);
    return true;
  };
  const onKey = (key: string, far: boolean): boolean => {
    const arrow = ARROWS[key];
    if (arrow) return onArrow(arrow, far);
    if (measure.on && (key === 'Enter' || key === ' ')) {
      measure.put(measure.aim ?? toDrawing(paper.middle));
      return true;
    }
    if (measure.on && key === 'Escape') {
      measure.back();
      return true;
    }
    if (key === '+' || key === '=') return onZoom?.(1.4, paper.middle) ?? false;
    if (key === '-') return onZoom?.(1 / 1.4, paper.middle) ?? false;
    if (key !== '0' || !props.onFit) return false;
    props.onFit();
    return true;
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.target !== frame.current || event.ctrlKey || event.metaKey || event.altKey) return;
    if (onKey(event.key, event.shiftKey)) event.preventDefault();
  };

  const board = {
    role: 'application',
    tabIndex: 0,
    'aria-labelledby': props.labelId,
    'aria-describedby': `${id}-help`,
    ...gestures,
    onKeyDown,
    className: cn(
      'size-full focus-visible:-outline-offset-2',
      larger ? 'touch-none' : 'touch-pan-y',
      measure.on ? 'cursor-crosshair' : larger && 'cursor-grab',
    ),
  };
  return (
    <div className="relative" style={{ width: paper.width, height: paper.height }}>
      <div ref={frame} {...board}>
        <svg
          role="img"
          aria-labelledby={`${id}-title`}
          width={paper.width}
          height={paper.height}
          className="block"
        >
          <title id={`${id}-title`}>{props.sentence}</title>
          {props.children}
        </svg>
        <span id={`${id}-help`} hidden>
          {HELP}
        </span>
      </div>
      {props.overlay}
    </div>
  );
}
