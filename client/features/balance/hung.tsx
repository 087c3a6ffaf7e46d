import { useUnits } from '#client/lib/units.ts';
import type { DrawnMass } from './beam-drawing.ts';

interface HungProps {
  hung: DrawnMass;
  /** the bar at its arm */
  y: number;
  fill: string;
  lit: boolean;
  picked: boolean;
  onLight: (key: string | null) => void;
  onOpen: (key: string) => void;
}

const MOVES = { transition: 'transform 150ms ease-out' };

/** One weight on its string. Hover or focus lights its rows in the sheet; a press shows its parts there. */
export function Hung({ hung, y, fill, lit, picked, onLight, onOpen }: HungProps) {
  const { mass, x, radius, place, figure } = hung;
  const units = useUnits();
  const anchor = place.side === 'below' ? 'middle' : place.side === 'left' ? 'end' : 'start';
  const textX = place.side === 'below' ? 0 : place.side === 'left' ? -radius - 7 : radius + 7;
  const textY = place.labelY - place.string;
  return (
    <g
      role="button"
      tabIndex={0}
      aria-label={`${mass.name} ${figure} at ${units.format(mass.x, 'length')}. Show its parts.`}
      onPointerEnter={() => onLight(mass.key)}
      onPointerLeave={() => onLight(null)}
      onFocus={() => onLight(mass.key)}
      onBlur={() => onLight(null)}
      onClick={() => onOpen(mass.key)}
      onKeyDown={(event) => {
        if (event.key !== 'Enter' && event.key !== ' ') return;
        event.preventDefault();
        onOpen(mass.key);
      }}
      className="group cursor-pointer outline-none"
      style={{ ...MOVES, transform: `translate(${x}px, ${y}px)` }}
    >
      <line y2={place.string} stroke="var(--pencil)" strokeWidth={1} style={MOVES} />
      <g style={{ ...MOVES, transform: `translateY(${place.string}px)` }}>
        {(lit || picked) && (
          <circle cy={radius} r={radius + 3.5} fill="none" stroke="var(--ink)" strokeWidth={2} />
        )}
        <circle
          cy={radius}
          r={radius + 6}
          fill="none"
          strokeWidth={2}
          className="stroke-transparent group-focus-visible:stroke-ink"
        />
        <circle cy={radius} r={Math.max(radius, 22)} fill="transparent" />
        <circle cy={radius} r={radius} fill="var(--sheet)" />
        <circle cy={radius} r={radius} fill={fill} stroke="var(--pencil)" strokeWidth={1.2} />
        <g
          textAnchor={anchor}
          stroke="var(--sheet)"
          strokeWidth={3}
          strokeLinejoin="round"
          paintOrder="stroke"
          className="select-none"
        >
          <text
            x={textX}
            y={textY + 12}
            fill={lit || picked ? 'var(--ink)' : 'var(--pencil)'}
            className="text-note font-semibold"
          >
            {`${mass.name} `}
          </text>
          <text x={textX} y={textY + 27} fill="var(--graphite)" className="text-label">
            {figure}
          </text>
        </g>
      </g>
    </g>
  );
}
