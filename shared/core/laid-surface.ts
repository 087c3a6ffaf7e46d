import { measureParts, type LineWithLump } from './lines.ts';
import { noticeBoard, type Notice } from './notices.ts';
import { stillKnown, type PartMemory } from './part-memory.ts';
import { planformOf } from './planform.ts';
import type { Plan, Surface } from './plan.ts';
import type { Planform } from './result.ts';
import { selfCrossingAt } from './section.ts';
import { surfaceLine, type SurfaceLine } from './stations.ts';

/** One surface of a plan with all that an estimate finds of it alone. */
export interface LaidSurface {
  surface: Surface;
  materials: Plan['materials'];
  line: SurfaceLine;
  planform: Planform;
  lines: LineWithLump[];
  /** what each part came to, for the next estimate */
  parts: PartMemory;
  /** of its panels and sections */
  shapeNotices: Notice[];
  /** of its parts */
  partNotices: Notice[];
}

/**
 * The surfaces that the last estimate laid out. An edit leaves most of a plan as the very objects that they were; a
 * plan that is changed in place must not be estimated with a memory.
 */
export interface EstimateMemory {
  surfaces: readonly LaidSurface[];
}

/** A memory of nothing. @example newMemory() // → { surfaces: [] } */
export const newMemory = (): EstimateMemory => ({ surfaces: [] });

/** Stations that a surface may keep from one estimate to the next. */
const KEPT_STATIONS = 6_000;

/**
 * A surface with its parts measured, or what the memory holds of the same surface in the same materials. Where only
 * some parts are others, its stations are still good, and so is every part that has none of these within its reach.
 * @throws RangeError when a part names a material that the plan does not hold
 * @example laySurface(EXAMPLE_PLAN, EXAMPLE_WING, newMemory()).planform.mac // → 100
 */
export function laySurface(plan: Plan, surface: Surface, memory: EstimateMemory): LaidSurface {
  const { materials } = plan;
  const known = memory.surfaces.find((laid) => laid.surface === surface && laid.materials === materials);
  if (known) return known;
  const before = laidOnSameStations(surface, memory);
  const line = before?.line ?? surfaceLine(surface);
  const shape = noticeBoard();
  checkShape(surface, line, shape.tell);
  const parts = noticeBoard();
  const stillGood = stillKnown(before?.parts, surface, line);
  const measured = measureParts(plan, surface, line, parts.tell, stillGood);
  return {
    surface,
    materials,
    line,
    planform: planformOf(surface, line),
    lines: measured.lines,
    parts: { surface, line, known: measured.known },
    shapeNotices: shape.notices,
    partNotices: parts.notices,
  };
}

function laidOnSameStations({ panels, apex }: Surface, memory: EstimateMemory): LaidSurface | undefined {
  const before = memory.surfaces.find(({ surface }) => surface.panels === panels && surface.apex === apex);
  const stations = before?.line.panels.reduce((sum, { known }) => sum + known.size, 0) ?? 0;
  return stations <= KEPT_STATIONS ? before : undefined;
}

function checkShape(surface: Surface, line: SurfaceLine, tell: (notice: Notice) => void): void {
  line.panels.forEach((panel, i) => {
    for (const end of ['root', 'tip'] as const) {
      const at = selfCrossingAt(panel[end](panel.chord[end === 'root' ? 0 : 1]));
      if (at !== null) tell({ code: 'section_self_crossing', path: surface.key, panel: i, end, at });
    }
    const inner = line.panels[i - 1];
    const step = inner ? panel.chord[0] - inner.chord[1] : 0;
    if (Math.abs(step) > 1e-6) tell({ code: 'chord_step', path: surface.key, panel: i, by: step });
  });
}
