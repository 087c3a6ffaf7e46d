import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';
import type { Plan } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';

interface SidesNamedProps {
  plan: Plan;
  sheet: Sheet;
  /** px */
  y: number;
  /** starboard lies to the left, as seen from ahead */
  fromAhead?: boolean;
}

/** Which half is port and which starboard, under the wing's tips. */
export function SidesNamed({ plan, sheet, y, fromAhead = false }: SidesNamedProps) {
  const spans = plan.surfaces.filter(({ mirrored }) => mirrored).map((surface) => planformOf(surface).span);
  if (spans.length === 0) return null;
  const reach = Math.max(...spans) / 4;
  const x = (across: number) => toPx(sheet, fromAhead ? [across, 0] : [0, across])[0];
  const starboard = fromAhead ? -reach : reach;
  return (
    <g pointerEvents="none">
      <SheetText x={x(-starboard)} y={y} textAnchor="middle">
        port
      </SheetText>
      <SheetText x={x(starboard)} y={y} textAnchor="middle">
        starboard
      </SheetText>
    </g>
  );
}
