import { useUnits } from '#client/lib/units.ts';
import type { Beam } from '#shared/core/beam.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { BeamDrawing } from './beam-drawing.ts';

interface BeamRulerProps {
  beam: Beam;
  drawing: BeamDrawing;
  outside: boolean;
}

const MOVES = { transition: 'transform 150ms ease-out' };

/** Lengths aft of the datum under the beam, with the mean aerodynamic chord and the balance point on it. */
export function BeamRuler({ beam, drawing, outside }: BeamRulerProps) {
  const { ruler, rulerY, toX, perMark, chordX } = drawing;
  const units = useUnits();
  const balance = outside ? 'var(--red)' : 'var(--pencil)';
  const digits = ruler.step < 1 ? 1 : 0;
  return (
    <g aria-hidden="true">
      {chordX && (
        <rect
          x={chordX[0]}
          y={rulerY - 7}
          width={chordX[1] - chordX[0]}
          height={7}
          fill="var(--ink-wash)"
          stroke="var(--graphite)"
        />
      )}
      <line x1={0} x2="100%" y1={rulerY} y2={rulerY} stroke="var(--graphite)" />
      {ruler.between.map((mark) => (
        <path key={mark} d={`M${toX(mark * perMark)} ${rulerY}v4`} stroke="var(--graphite)" />
      ))}
      {ruler.numbered.map((mark) => (
        <g key={mark}>
          <path d={`M${toX(mark * perMark)} ${rulerY}v7`} stroke="var(--graphite)" />
          <text
            x={toX(mark * perMark)}
            y={rulerY + 21}
            textAnchor="middle"
            fill="var(--graphite)"
            stroke="var(--sheet)"
            strokeWidth={4}
            paintOrder="stroke"
            className="text-label"
          >
            {formatNumber(mark, digits)}
          </text>
        </g>
      ))}
      <text
        x="100%"
        y={rulerY + 37}
        textAnchor="end"
        fill="var(--graphite)"
        stroke="var(--sheet)"
        strokeWidth={4}
        paintOrder="stroke"
        className="text-label"
      >
        {units.label('length')} aft of the datum
      </text>
      <line
        y1={rulerY - 13}
        y2={rulerY + 5}
        stroke={balance}
        strokeWidth={4}
        style={{ ...MOVES, transform: `translateX(${toX(beam.balance.x)}px)` }}
      />
    </g>
  );
}
