import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { CutStick } from '#shared/core/cut/pack-sticks.ts';
import type { PlanMaterial } from '#shared/core/plan.ts';

interface StickFigureProps {
  stick: CutStick;
  /** the longest stick of the page, mm: all are drawn to one scale */
  longest: number;
  material: PlanMaterial | undefined;
  /** which of the list's rows each cut is, from 1 */
  numbers: ReadonlyMap<string, number>;
}

const HEIGHT = 26;
const WIDE = 1000;

/** One stick of stock with what is cut from it, numbered as in the list beside it. */
export function StickFigure({ stick, longest, material, numbers }: StickFigureProps) {
  const units = useUnits();
  const scale = WIDE / longest;
  const fill = hatchFill(material?.category ?? 'wood', material?.density);
  const told = stick.cuts.map(
    ({ id, from, to }) => `${numbers.get(id) ?? ''}: ${units.format(to - from, 'length')}`,
  );
  const name = `${stick.stock ?? 'New stick'}, ${units.format(stick.length, 'length')}: ${told.join(', ')}`;
  return (
    <svg viewBox={`-1 -1 ${WIDE + 2} ${HEIGHT + 2}`} role="img" aria-label={name} className="block w-full">
      <rect
        width={stick.length * scale}
        height={HEIGHT}
        fill="none"
        stroke="var(--graphite)"
        strokeDasharray="4 3"
      />
      {stick.cuts.map(({ id, from, to }) => (
        <g key={id}>
          <rect
            x={from * scale}
            width={Math.max(0, (to - from) * scale)}
            height={HEIGHT}
            fill={fill}
            stroke="var(--pencil)"
            strokeWidth={1.2}
          />
          <text
            x={((from + to) / 2) * scale}
            y={HEIGHT / 2 + 6}
            textAnchor="middle"
            fontSize={17}
            fontWeight={600}
            fill="var(--pencil)"
            stroke="var(--sheet)"
            strokeWidth={4}
            paintOrder="stroke"
          >
            {numbers.get(id)}
          </text>
        </g>
      ))}
    </svg>
  );
}
