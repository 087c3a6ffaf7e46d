import { useMemo } from 'react';
import { hatchFill } from '#client/components/ui/hatch.tsx';
import type { Plan } from '#shared/core/plan.ts';
import { planView } from '#shared/drawing/plan-view.ts';
import { boundsOf, type Point, type Shape, type ShapeKind } from '#shared/drawing/shape.ts';

interface PlanPictureProps {
  plan: Plan;
  /** Arm of the balance point, mm. */
  balance: number | null;
  label: string;
}

/** What would only cover the structure, or is too fine for a small picture. */
const LEFT_OUT: ReadonlySet<ShapeKind> = new Set([
  'covering',
  'finish',
  'stock',
  'notch',
  'lightening',
  'item',
]);

/** The model from above, nose up, small: built from the same shapes as the drawing. */
export function PlanPicture({ plan, balance, label }: PlanPictureProps) {
  const shapes = useMemo(
    () => planView(plan).filter(({ kind, hidden }) => !LEFT_OUT.has(kind) && !hidden),
    [plan],
  );
  const bounds = boundsOf(shapes);
  if (!bounds) return null;
  const { min, max } = bounds;
  const [length, span] = [Math.max(1, max[0] - min[0]), Math.max(1, max[1] - min[1])];
  const radius = Math.max(length, span) / 110;
  return (
    <svg
      viewBox={`${min[1]} ${min[0]} ${span} ${length}`}
      role="img"
      aria-label={label}
      className="w-full overflow-visible"
    >
      {shapes.map((shape, i) => (
        <path
          key={i}
          d={pathOf(shape)}
          fill={fillOf(shape)}
          stroke="var(--pencil)"
          strokeWidth={shape.kind === 'outline' ? 1.4 : 0.5}
          strokeLinejoin="round"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {balance !== null && <BalanceMark x={balance} radius={radius} />}
    </svg>
  );
}

/** Nose up: y goes across the picture and x down it. */
function pathOf({ points, hole, closed }: Shape): string {
  const ring = (line: readonly Point[]) =>
    `M${line.map(([x, y]) => `${y.toFixed(1)} ${x.toFixed(1)}`).join('L')}${closed ? 'Z' : ''}`;
  return hole ? ring(points) + ring(hole) : ring(points);
}

function fillOf({ kind, material, closed }: Shape): string {
  if (!closed || kind === 'outline' || kind === 'joint') return 'none';
  if (kind === 'skin' || kind === 'tipBlock' || kind === 'sheet' || kind === 'plate') {
    return material ? hatchFill(material.category, material.density) : 'var(--wood-light)';
  }
  return kind === 'ribs' ? 'var(--wood)' : 'var(--wood-light)';
}

/** The quartered circle of the balance point. */
function BalanceMark({ x, radius: r }: { x: number; radius: number }) {
  return (
    <g transform={`translate(0 ${x})`}>
      <circle
        r={r}
        fill="var(--sheet)"
        stroke="var(--pencil)"
        strokeWidth={1.4}
        vectorEffect="non-scaling-stroke"
      />
      <path d={`M0 0V${-r}A${r} ${r} 0 0 1 ${r} 0ZM0 0V${r}A${r} ${r} 0 0 1 ${-r} 0Z`} fill="var(--pencil)" />
    </g>
  );
}
