import type { ReactNode } from 'react';
import type { Beam } from '#shared/core/beam.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { chordLabels, chordScale } from './chord-scale.ts';

interface ChordDetailProps {
  beam: Beam;
  width: number;
  /** ends of the chord on the ruler above */
  chordX: [number, number] | null;
  outside: boolean;
}

const MOVES = { transition: 'transform 150ms ease-out' };
const BAR = 56;
const THICK = 16;
const LABELS = 28;
const HEIGHT = BAR + THICK + 30;

/** The mean aerodynamic chord drawn larger, as a detail of the ruler: wanted range, balance ±, neutral point. */
export function ChordDetail({ beam, width, chordX, outside }: ChordDetailProps) {
  const scale = chordScale(beam, width);
  if (!scale) return null;
  const { toX, percent, range } = scale;
  const [from, to] = [toX(0), toX(100)];
  const ticks = rulerOf(scale.from, scale.to, toX(scale.to) - toX(scale.from), width < 600 ? 44 : 80);
  const { balance, wanted } = percent;
  const tone = outside ? 'var(--red)' : 'var(--pencil)';
  const band = (beam.balance.uPercentMac ?? 0) * (toX(1) - toX(0));

  return (
    <svg
      aria-hidden="true"
      width={width}
      height={HEIGHT}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      className="block max-w-full overflow-visible print:h-auto"
    >
      {chordX && (
        <path
          d={`M${chordX[0]} -40L${from} ${BAR}M${chordX[1]} -40L${to} ${BAR}`}
          stroke="var(--strong-rule)"
          strokeDasharray="2 3"
        />
      )}
      <rect x={from} y={BAR} width={to - from} height={THICK} fill="var(--sheet)" stroke="var(--graphite)" />
      {range && (
        <rect
          x={toX(range[0])}
          y={BAR}
          width={Math.max(2, toX(range[1]) - toX(range[0]))}
          height={THICK}
          fill="var(--ink-wash)"
          stroke="var(--ink)"
        />
      )}
      {ticks.numbered.map((mark) => (
        <g key={mark}>
          <path d={`M${toX(mark)} ${BAR + THICK}v5`} stroke="var(--graphite)" />
          <text
            x={toX(mark)}
            y={BAR + THICK + 19}
            textAnchor="middle"
            fill="var(--graphite)"
            className="text-label"
          >
            {formatNumber(mark, 0)}
            {mark === ticks.numbered.at(-1) && `${NARROW_SPACE}% MAC`}
          </text>
        </g>
      ))}
      {wanted !== null && (
        <Mark x={toX(wanted)}>
          <path d={`M0 ${BAR - 3}v${THICK + 6}`} stroke="var(--ink)" strokeWidth={2} />
        </Mark>
      )}
      {percent.neutralPoint !== null && (
        <Mark x={toX(percent.neutralPoint)}>
          <path
            d={`M0 ${BAR - 3}v${THICK + 8}`}
            stroke="var(--pencil)"
            strokeWidth={1.5}
            strokeDasharray="3 2"
          />
        </Mark>
      )}
      {balance !== null && (
        <Mark x={toX(balance)}>
          <rect x={-band} y={BAR + 3} width={2 * band} height={THICK - 6} fill={tone} opacity={0.25} />
          <path d={`M0 ${BAR - 5}v${THICK + 10}`} stroke={tone} strokeWidth={4} />
        </Mark>
      )}
      {chordLabels(scale, width, outside).map(({ key, text, x, at, tone: colour, strong }) => (
        <g key={key}>
          <path d={`M${at} ${LABELS + 6}L${x} ${BAR - 6}`} stroke={colour} fill="none" />
          <text
            x={at}
            y={LABELS}
            textAnchor="middle"
            fill={colour}
            stroke="var(--sheet)"
            strokeWidth={4}
            paintOrder="stroke"
            className={strong ? 'text-note font-semibold' : 'text-note'}
          >
            {text}
          </text>
        </g>
      ))}
    </svg>
  );
}

function Mark({ x, children }: { x: number; children: ReactNode }) {
  return <g style={{ ...MOVES, transform: `translateX(${x}px)` }}>{children}</g>;
}
