import type { ReactNode } from 'react';
import type { MaterialCategory } from '#shared/core/plan.ts';

/** What a hatch can stand for: a material's category, or `gear` for things bought ready. */
export type HatchKind = MaterialCategory | 'gear';

/** Upper ends of the wood grades, kg/m³: light, medium, hard balsa; above that other woods. */
const GRADES = [120, 170, 240] as const;
/** Grain of each grade: weight of line and distance between lines, in drawing units. */
const GRAIN = [
  { weight: 0.45, step: 6 },
  { weight: 0.8, step: 4.6 },
  { weight: 1.1, step: 3.6 },
  { weight: 1.5, step: 2.9 },
] as const;

/** 0 light, 1 medium, 2 hard balsa, 3 heavier woods; medium where the density is not known. */
export function woodGrade(density?: number | null): 0 | 1 | 2 | 3 {
  if (density === undefined || density === null) return 1;
  if (density < GRADES[0]) return 0;
  if (density < GRADES[1]) return 1;
  return density < GRADES[2] ? 2 : 3;
}

const idOf = (kind: HatchKind, grade: number) => `hatch-${kind}${kind === 'wood' ? `-${grade}` : ''}`;

/** Value of an SVG `fill` for a kind of material; needs `HatchDefs` once on the page. */
export function hatchFill(kind: HatchKind, density?: number | null): string {
  return `url(#${idOf(kind, woodGrade(density))})`;
}

/** The drafting hatches. Mounted once by the page's frame, so that every drawing and chart can use them. */
export function HatchDefs() {
  return (
    <svg aria-hidden="true" focusable="false" width="0" height="0" className="absolute">
      <defs>
        {GRAIN.map(({ weight, step }, grade) => (
          <Hatch key={grade} id={idOf('wood', grade)} width={48} height={step * 2} ground="var(--wood)">
            <path
              d={`M0 ${step * 0.5}H30q9 0 18 0M0 ${step * 1.5}H12q9 ${-step * 0.3} 18 0H48`}
              fill="none"
              stroke="var(--grain)"
              strokeWidth={weight}
            />
          </Hatch>
        ))}
        <Hatch id={idOf('sheet', 0)} width={12} height={8} ground="var(--wood-light)">
          <path d="M0 2H12M0 3.6H12" stroke="var(--grain)" strokeWidth={0.7} />
          <path d="M2 5.4v1.6M6 5.4v1.6M10 5.4v1.6" stroke="var(--grain)" strokeWidth={0.7} />
        </Hatch>
        <Hatch id={idOf('composite', 0)} width={8} height={8} ground="var(--sheet)">
          <path d="M0 2H4M4 6H8" stroke="var(--pencil)" strokeWidth={1.6} />
          <path d="M2 4V8M6 0V4" stroke="var(--pencil)" strokeWidth={0.8} />
        </Hatch>
        <Hatch id={idOf('metal', 0)} width={5} height={5} ground="var(--sheet)">
          <path d="M0 5 5 0M0 0 5 5" stroke="var(--pencil)" strokeWidth={0.8} />
        </Hatch>
        <Hatch id={idOf('gear', 0)} width={6} height={6} ground="var(--ink-wash)">
          <circle cx={1.5} cy={1.5} r={0.9} fill="var(--ink)" />
          <circle cx={4.5} cy={4.5} r={0.9} fill="var(--ink)" />
        </Hatch>
        <Hatch id={idOf('covering', 0)} width={9} height={9} ground="var(--paper)">
          <path d="M0 9 9 0" stroke="var(--strong-rule)" strokeWidth={0.8} />
        </Hatch>
        <Hatch id={idOf('finish', 0)} width={10} height={6} ground="var(--paper)">
          <path d="M1 1.5H5M6 4.5H10" stroke="var(--graphite)" strokeWidth={0.7} />
        </Hatch>
        <Hatch id={idOf('adhesive', 0)} width={9} height={9} ground="var(--paper)">
          <path d="M3 3 6 6M6 3 3 6" stroke="var(--graphite)" strokeWidth={0.8} />
        </Hatch>
      </defs>
    </svg>
  );
}

interface HatchProps {
  id: string;
  width: number;
  height: number;
  ground: string;
  children: ReactNode;
}

function Hatch({ id, width, height, ground, children }: HatchProps) {
  return (
    <pattern id={id} width={width} height={height} patternUnits="userSpaceOnUse">
      <rect width={width} height={height} fill={ground} />
      {children}
    </pattern>
  );
}
