import { hatchFill } from '#client/components/ui/hatch.tsx';
import type { Shape, ShapeKind } from '#shared/drawing/shape.ts';

/** How a shape is drawn in pencil. Undefined leaves the attribute off. */
export interface Look {
  fill: string;
  fillOpacity?: number;
  stroke: string;
  strokeWidth: number;
  strokeDasharray?: string;
}

const DASHED = '4 3';

/** Surfaces of cloth and dope are seen only when they are picked. */
const UNSEEN: ReadonlySet<ShapeKind> = new Set(['covering', 'finish']);
/** Wide areas whose contents must stay readable through their hatch. */
const WIDE: ReadonlySet<ShapeKind> = new Set(['skin', 'sheet', 'plate', 'bar', 'ribs']);

export function lookOf(shape: Shape): Look | null {
  if (UNSEEN.has(shape.kind)) return null;
  switch (shape.kind) {
    case 'outline':
      return { fill: 'none', stroke: 'var(--pencil)', strokeWidth: 1.5 };
    case 'joint':
      return { fill: 'none', stroke: 'var(--graphite)', strokeWidth: 1, strokeDasharray: '9 3 2 3' };
    case 'notch':
      return { fill: 'var(--sheet)', stroke: 'var(--pencil)', strokeWidth: 0.8 };
    case 'stock':
    case 'lightening':
      return { fill: 'none', stroke: 'var(--graphite)', strokeWidth: 0.8, strokeDasharray: DASHED };
    case 'item':
      return { fill: hatchFill('gear'), stroke: 'var(--pencil)', strokeWidth: 1 };
    default:
      return hatchedLook(shape);
  }
}

/** Parts, hatched by what they are made of; dashed and empty where they lie under something. */
function hatchedLook(shape: Shape): Look {
  const fill = shape.material ? hatchFill(shape.material.category, shape.material.density) : 'var(--sheet)';
  if (shape.hidden) {
    return { fill: 'none', stroke: 'var(--graphite)', strokeWidth: 0.8, strokeDasharray: DASHED };
  }
  return {
    fill,
    ...(WIDE.has(shape.kind) && { fillOpacity: 0.5 }),
    stroke: 'var(--pencil)',
    strokeWidth: 0.8,
  };
}

const INKED_AS_WASH: ReadonlySet<ShapeKind> = new Set([
  'skin',
  'sheet',
  'covering',
  'finish',
  'plate',
  'bar',
  'tipBlock',
  'item',
]);

/** The picked part in ink: solid where it is slender, a wash with an ink edge where it is wide, as a rib is when cut. */
export function pickedLook({ kind, closed }: Shape, cut: boolean): Look | null {
  if (kind === 'notch' || kind === 'lightening' || kind === 'stock') return null;
  if (!closed) return { fill: 'none', stroke: 'var(--ink)', strokeWidth: 3 };
  if (INKED_AS_WASH.has(kind) || (cut && kind === 'ribs')) {
    return { fill: 'var(--ink)', fillOpacity: 0.2, stroke: 'var(--ink)', strokeWidth: 2 };
  }
  return { fill: 'var(--ink)', stroke: 'var(--ink)', strokeWidth: 1.2 };
}

/** What the pointer is over: an ink edge only. */
export function hoveredLook({ closed }: Shape): Look {
  return { fill: closed ? 'var(--ink)' : 'none', fillOpacity: 0.12, stroke: 'var(--ink)', strokeWidth: 1.6 };
}
