import { useId, useMemo } from 'react';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { ChordDetail } from './chord-detail.tsx';
import { drawBeam } from './beam-drawing.ts';
import { beamSentence } from './beam-sentence.ts';
import { Hung } from './hung.tsx';
import { groupHatch } from './hatches.ts';
import { BeamRuler } from './beam-ruler.tsx';

interface BeamViewProps {
  beam: Beam;
  plan: Plan;
  lines: readonly Line[];
  /** key of the group that is lit */
  lit: string | null;
  onLight: (key: string | null) => void;
  /** group that the picked part belongs to */
  picked: string | null;
  onOpen: (key: string) => void;
  outside: boolean;
}

/** Every group hung at its arm from one bar; the wanted balance point carries it, and it tips by what is left over. */
export function BeamView({ beam, plan, lines, lit, onLight, picked, onOpen, outside }: BeamViewProps) {
  const [frame, width] = useWidth<HTMLDivElement>();
  const sentence = useId();
  const units = useUnits();
  const drawing = useMemo(() => drawBeam(beam, width, units), [beam, width, units]);
  const { pivotX, barY, toX, height, rulerY, slope } = drawing;

  return (
    <div ref={frame} className="min-w-0">
      <p id={sentence} className="sr-only">
        {beamSentence(beam, units)}
      </p>
      <svg
        role="group"
        aria-label="The beam"
        aria-describedby={sentence}
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="block max-w-full overflow-visible print:h-auto"
      >
        <BeamRuler beam={beam} drawing={drawing} outside={outside} />
        <g aria-hidden="true">
          <path
            d={`M${pivotX} ${barY + 1.5}l9 22h-18z`}
            fill="var(--sheet)"
            stroke="var(--ink)"
            strokeWidth={1.5}
            strokeLinejoin="round"
          />
          <path d={`M${pivotX} ${barY + 23.5}V${rulerY}`} stroke="var(--ink)" strokeWidth={1.5} />
        </g>
        {drawing.hung.map((hung) => (
          <Hung
            key={hung.mass.key}
            hung={hung}
            y={barY + slope * (hung.x - pivotX)}
            fill={groupHatch(
              plan,
              lines.filter(({ id }) => hung.mass.lines.includes(id)),
            )}
            lit={lit === hung.mass.key}
            picked={picked === hung.mass.key}
            onLight={onLight}
            onOpen={onOpen}
          />
        ))}
        <line
          aria-hidden="true"
          x1={toX(drawing.from)}
          x2={toX(drawing.to)}
          y1={barY}
          y2={barY}
          stroke="var(--pencil)"
          strokeWidth={3}
          strokeLinecap="round"
          style={{
            transform: `rotate(${beam.tilt}deg)`,
            transformOrigin: `${pivotX}px ${barY}px`,
            transition: 'transform 150ms ease-out',
          }}
        />
      </svg>
      {beam.chord && <ChordDetail beam={beam} width={width} chordX={drawing.chordX} outside={outside} />}
    </div>
  );
}
