import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';
import { pointOf, stationAt, surfaceLine } from '#shared/core/stations.ts';
import { SidesNamed } from './sides-named.tsx';

interface FrontMarksProps {
  plan: Plan;
  sheet: Sheet;
  /** px under which nothing is drawn */
  bottom: number;
  brief: boolean;
}

/** From ahead: each panel's dihedral over its middle, the span of the widest surface, and the plane of symmetry. */
export function FrontMarks({ plan, sheet, bottom, brief }: FrontMarksProps) {
  const units = useUnits();
  const widest = plan.surfaces.reduce<{ surface: Surface; span: number } | null>((most, surface) => {
    const { span } = planformOf(surface);
    return surface.mirrored && (!most || span > most.span) ? { surface, span } : most;
  }, null);
  const [middle] = toPx(sheet, [0, 0]);
  const x = (across: number) => toPx(sheet, [across, 0])[0];
  return (
    <g pointerEvents="none">
      <path
        d={`M${middle} 6V${bottom + 10}`}
        stroke="var(--graphite)"
        strokeWidth={1}
        strokeDasharray="12 3 2 3"
      />
      {plan.surfaces.flatMap((surface) =>
        surface.mirrored
          ? angles(surface).map((angle) => <Angle key={angle.key} {...{ angle, sheet }} />)
          : [],
      )}
      {widest && (
        <g stroke="var(--graphite)">
          <path
            d={`M${x(-widest.span / 2)} ${bottom + 27}v10M${x(widest.span / 2)} ${bottom + 27}v10M${x(-widest.span / 2)} ${bottom + 32}H${x(widest.span / 2)}`}
          />
          <SheetText x={middle} y={bottom + 48} textAnchor="middle">
            {units.size(Math.round(widest.span * 10) / 10, { bare: true })}
          </SheetText>
        </g>
      )}
      {!brief && <SidesNamed plan={plan} sheet={sheet} y={bottom + 14} fromAhead />}
    </g>
  );
}

interface PanelAngle {
  key: string;
  at: readonly [number, number];
  degrees: number;
}

/** Where each panel's dihedral is written: over the middle of the port panel, to the right. */
function angles(surface: Surface): PanelAngle[] {
  const line = surfaceLine(surface);
  return surface.panels.flatMap((panel, i): PanelAngle[] => {
    const laid = line.panels[i];
    if (!laid || panel.dihedral === 0) return [];
    const [, y, z] = pointOf(stationAt(line, (laid.start + laid.end) / 2, laid), 0, 0);
    return [{ key: `${surface.key} ${i}`, at: [y, z], degrees: panel.dihedral }];
  });
}

function Angle({ angle, sheet }: { angle: PanelAngle; sheet: Sheet }) {
  const units = useUnits();
  const [x, y] = toPx(sheet, angle.at);
  return (
    <SheetText x={x} y={y - 12} textAnchor="middle">
      {units.format(angle.degrees, 'angle')}
    </SheetText>
  );
}
