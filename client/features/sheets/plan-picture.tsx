import { frameOf, isEdgeOn, sidesOf } from '#shared/drawing/frames.ts';
import { halfOutline, tipLength } from '#shared/drawing/outline.ts';
import type { Plan, Solid } from '#shared/core/plan.ts';
import { surfaceLine } from '#shared/core/stations.ts';

interface PlanPictureProps {
  plan: Plan;
  /** mm aft of the datum */
  balance: number | null;
  className?: string;
}

type Outline = readonly (readonly [x: number, y: number])[];

/** The model from above, with its balance point. */
export function PlanPicture({ plan, balance, className }: PlanPictureProps) {
  const outlines = [...plan.solids.map(solidOutline), ...surfaceOutlines(plan)].filter(
    ({ length }) => length > 2,
  );
  const points = outlines.flat();
  if (points.length === 0) return null;
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const air = 0.02 * Math.max(x1 - x0, y1 - y0);
  const mark = 2.5 * air;
  return (
    <svg
      role="img"
      aria-label="The model from above, its balance point marked"
      viewBox={`${y0 - air} ${x0 - air} ${y1 - y0 + 2 * air} ${x1 - x0 + 2 * air}`}
      className={className}
    >
      {outlines.map((outline, i) => (
        <polygon
          key={i}
          points={outline.map(([x, y]) => `${y},${x}`).join(' ')}
          fill="var(--sheet)"
          stroke="var(--pencil)"
          strokeWidth={0.9}
          strokeLinejoin="round"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {balance !== null && (
        <path
          d={`M${-mark} ${balance}H${mark}M0 ${balance - mark}V${balance + mark}`}
          stroke="var(--red)"
          strokeWidth={1.4}
          vectorEffect="non-scaling-stroke"
        />
      )}
    </svg>
  );
}

function surfaceOutlines({ surfaces }: Plan): Outline[] {
  return surfaces.flatMap((surface) => {
    const line = surfaceLine(surface);
    if (isEdgeOn('above', line)) return [];
    return sidesOf(surface).map((side) =>
      halfOutline(line, tipLength(surface, side), frameOf('above', side)),
    );
  });
}

/** A stick as its own width; a plate from above as thick as it is, its copies side by side left to the eye. */
function solidOutline(solid: Solid): Outline {
  if (solid.shape === 'bar') {
    const [[x0, y0], [x1, y1], [w0, w1]] = [solid.from, solid.to, solid.width];
    return [
      [x0, y0 - w0 / 2],
      [x1, y1 - w1 / 2],
      [x1, y1 + w1 / 2],
      [x0, y0 + w0 / 2],
    ];
  }
  const xs = solid.outline.map(([x]) => x);
  const [from, to] = [Math.min(...xs), Math.max(...xs)];
  const half = solid.thickness / 2;
  return [
    [from, solid.y - half],
    [to, solid.y - half],
    [to, solid.y + half],
    [from, solid.y + half],
  ];
}
