import { hatchFill } from '#client/components/ui/hatch.tsx';
import type { Laid } from '#shared/core/cut/lay-sheet.ts';
import type { PlanMaterial } from '#shared/core/plan.ts';

interface SheetFigureProps {
  /** what the figure shows, for who does not see it */
  label: string;
  sheet: { length: number; width: number };
  laid: readonly Laid[];
  /** size of each blank, and its number in the list beside it */
  blanks: ReadonlyMap<string, { length: number; width: number; number: number }>;
  /** the longest sheet of the page, mm: all are drawn to one scale */
  longest: number;
  material: PlanMaterial | undefined;
  density?: number;
}

const WIDE = 1000;
/** Smaller pieces than this, in drawing units, carry no number. */
const LEGIBLE = 20;

/** One sheet from above, grain along it, with what is cut from it, numbered as in the list beside it. */
export function SheetFigure({ label, sheet, laid, blanks, longest, material, density }: SheetFigureProps) {
  const scale = WIDE / longest;
  const [long, wide] = [sheet.length * scale, sheet.width * scale];
  const fill = hatchFill(material?.category ?? 'wood', density ?? material?.density);
  return (
    <svg viewBox={`-1 -1 ${WIDE + 2} ${wide + 2}`} role="img" aria-label={label} className="block w-full">
      <rect width={long} height={wide} fill="none" stroke="var(--graphite)" strokeDasharray="4 3" />
      {laid.map(({ id, at }) => {
        const blank = blanks.get(id);
        if (!blank) return null;
        const [w, h] = [blank.length * scale, blank.width * scale];
        return (
          <g key={id} transform={`translate(${at[0] * scale} ${at[1] * scale})`}>
            <rect width={w} height={h} fill={fill} stroke="var(--pencil)" strokeWidth={1} />
            {w >= LEGIBLE && h >= LEGIBLE * 0.6 && (
              <text
                x={w / 2}
                y={h / 2}
                dominantBaseline="central"
                textAnchor="middle"
                fontSize={Math.min(17, h * 0.9)}
                fontWeight={600}
                fill="var(--pencil)"
                stroke="var(--sheet)"
                strokeWidth={4}
                paintOrder="stroke"
              >
                {blank.number}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}
