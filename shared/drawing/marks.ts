import { positionOfPercent } from '#shared/core/balance.ts';
import { ribStations } from '#shared/core/half.ts';
import { planformOf } from '#shared/core/planform.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Balance } from '#shared/core/result.ts';
import { surfaceLine, type SurfaceLine } from '#shared/core/stations.ts';
import { wingReference } from '#shared/core/wing-reference.ts';

/** Lines across the drawing, all mm aft of the datum. Null where the model has none. */
export interface Marks {
  balance: { x: number; u: number } | null;
  /** wanted balance point, and the range about it */
  wanted: { x: number; from: number; to: number } | null;
  neutralPoint: number | null;
}

export function balanceMarks(plan: Plan, balance: Balance): Marks {
  const { x, u, neutralPoint } = balance;
  return { balance: x === null ? null : { x, u: u ?? 0 }, wanted: wantedOf(plan), neutralPoint };
}

function wantedOf(plan: Plan): Marks['wanted'] {
  const wing = wingReference(plan);
  if (!wing || !plan.target) return null;
  const at = (percent: number) => positionOfPercent(percent, wing.xLeMac, wing.mac);
  const { percentMac, tolerance } = plan.target;
  return { x: at(percentMac), from: at(percentMac - tolerance), to: at(percentMac + tolerance) };
}

/** The mean aerodynamic chord of a surface where it lies, mm. */
export interface MacMark {
  length: number;
  /** x of its leading edge; on a cranked surface not the surface's own edge at that place */
  x: number;
  y: number;
  /** station that lies at that y */
  s: number;
}

export function macMark(surface: Surface): MacMark {
  const line = surfaceLine(surface);
  const { mac, xLeMac, yMac } = planformOf(surface, line);
  return { length: mac, x: xLeMac, y: yMac, s: stationOfY(line, yMac) };
}

/** Station at a given y; an upright panel, whose y does not change, answers with its middle. */
function stationOfY(line: SurfaceLine, y: number): number {
  for (const panel of line.panels) {
    const span = panel.end - panel.start;
    const reach = span * panel.cos;
    if (reach === 0) continue;
    const share = (y - panel.y) / reach;
    if (share <= 1 + 1e-9 || panel === line.panels.at(-1)) {
      return panel.start + span * Math.min(1, Math.max(0, share));
    }
  }
  return line.length / 2;
}

/** Stations of all ribs of a surface, root to tip, each once: their place in this list is their number less one. */
export function ribNumbers(surface: Surface): number[] {
  const tip = surface.panels.reduce((sum, panel) => sum + panel.span, 0);
  const all = surface.parts
    .flatMap((part) => (part.kind === 'ribs' ? ribStations(part) : []))
    .filter((s) => s <= tip + 1e-6)
    .sort((a, b) => a - b);
  return all.filter((s, i) => i === 0 || s - (all[i - 1] ?? s) > 1e-6);
}
