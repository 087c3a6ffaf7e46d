import type { KeyboardEvent } from 'react';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Units } from '#shared/format/units.ts';
import { stepped, type Axis, type Handle, type Reach } from './handle.ts';
import { useHold, type HoldOptions } from './use-hold.ts';

interface HandleLayerProps extends Omit<HoldOptions, 'scale' | 'sign' | 'step'> {
  handles: readonly Handle[];
  sheet: Sheet;
  /** px that the drawing is pushed aside */
  pan: readonly [number, number];
  side: 'port' | 'starboard';
}

/** A sixteenth of an inch, or a millimetre. */
const stepOf = (units: Units) => (units.system === 'inch' ? 25.4 / 16 : 1);

/** What can be taken hold of: pulled by the pointer, or moved by the arrow keys. */
export function HandleLayer(props: HandleLayerProps) {
  const { handles, sheet, pan, side, edit, undo, onHold } = props;
  const units = useUnits();
  const step = stepOf(units);
  const sign = side === 'port' ? -1 : 1;
  const { held, begin, pull, letGo } = useHold({ edit, undo, onHold, scale: sheet.scale, sign, step });

  const onKeyDown = (event: KeyboardEvent, handle: Handle) => {
    const move = moveOf(event.key, sign);
    const reach = move && handle.reach[move.axis];
    if (!reach || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    event.stopPropagation();
    const value = stepped(reach, step, move.direction, event.shiftKey ? 10 : 1);
    if (value !== reach.value) edit(reach.set(value), `${handle.name}: ${move.axis}`);
  };
  return (
    <svg
      role="group"
      aria-label="Handles of the drawing"
      className="pointer-events-none absolute inset-0 size-full overflow-hidden"
    >
      {handles.map((handle) => {
        const [x, y] = toPx(sheet, [handle.at[0], sign * handle.at[1]]);
        const holding = held?.id === handle.id;
        return (
          <g
            key={handle.id}
            role="slider"
            tabIndex={0}
            aria-label={handle.name}
            aria-valuenow={valueOf(handle)}
            aria-valuetext={told(handle, null, units)}
            transform={`translate(${x + pan[0]} ${y + pan[1]})`}
            onPointerDown={(event) => begin(event, handle)}
            onPointerMove={pull}
            onPointerUp={letGo}
            onPointerCancel={letGo}
            onKeyDown={(event) => onKeyDown(event, handle)}
            className={`group pointer-events-auto touch-none outline-none ${cursorOf(handle)}`}
          >
            <circle r={10} fill="transparent" className="pointer-coarse:[r:18px]" />
            <circle
              r={7.5}
              fill="none"
              stroke="var(--ink)"
              strokeWidth={2}
              className="opacity-0 group-focus-visible:opacity-100"
            />
            <circle
              r={4}
              fill={holding ? 'var(--ink)' : 'var(--sheet)'}
              stroke="var(--ink)"
              strokeWidth={1.6}
            />
            <SheetText
              y={-12}
              pointerEvents="none"
              textAnchor="middle"
              fill="var(--ink)"
              fontWeight={600}
              className={holding ? '' : 'opacity-0 group-hover:opacity-100 group-focus-visible:opacity-100'}
            >
              {told(handle, holding ? held.axis : null, units)}
            </SheetText>
          </g>
        );
      })}
    </svg>
  );
}

interface Move {
  axis: Axis;
  direction: 1 | -1;
}

/** Left and right go along the span as it is seen, up and down along the chord. */
function moveOf(key: string, sign: 1 | -1): Move | null {
  switch (key) {
    case 'ArrowRight':
      return { axis: 's', direction: sign };
    case 'ArrowLeft':
      return { axis: 's', direction: sign === 1 ? -1 : 1 };
    case 'ArrowDown':
      return { axis: 'x', direction: 1 };
    case 'ArrowUp':
      return { axis: 'x', direction: -1 };
    default:
      return null;
  }
}

const valueOf = ({ reach }: Handle) => Math.round((reach.s ?? reach.x)?.value ?? 0);

/** What a handle's numbers are, or the one that is being pulled. */
function told({ reach }: Handle, axis: Axis | null, units: Units): string {
  const words = ({ value, word }: Reach) => `${units.size(value)} ${word}`;
  const reaches = axis === null ? [reach.s, reach.x] : [reach[axis]];
  return reaches.flatMap((one) => (one ? [words(one)] : [])).join(', ');
}

function cursorOf({ reach }: Handle): string {
  if (reach.s && reach.x) return 'cursor-move';
  return reach.s ? 'cursor-ew-resize' : 'cursor-ns-resize';
}
