import type { z } from 'zod';
import type { Panel, Plan } from '#shared/core/plan.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { item, panel, planSchema, solid, surface } from '#shared/schemas/plan.ts';
import { part } from '#shared/schemas/plan-parts.ts';
import { referenceIssues } from '#shared/schemas/plan-references.ts';

/** What a schema makes of an object; undefined where it refuses it. */
type Reader<T> = (value: unknown) => T | undefined;

/** Reads with a schema, and each object that it accepts only once. */
function remembering<T>(schema: z.ZodType<T>): Reader<T> {
  const good = new WeakMap<object, T>();
  return (value) => {
    if (typeof value !== 'object' || value === null) return undefined;
    const known = good.get(value);
    if (known !== undefined) return known;
    const { data } = schema.safeParse(value);
    if (data !== undefined) good.set(value, data);
    return data;
  };
}

const readPart = remembering(part);
const readPanel = remembering(panel);
const readItem = remembering(item);
const readSolid = remembering(solid);
const readMaterials = remembering(planSchema.shape.materials);

/** Stands for the panels of a surface while the rest of it is read. */
const SOME_PANEL: Panel = {
  span: 1,
  rootChord: 1,
  tipChord: 1,
  sweep: 0,
  dihedral: 0,
  rootSection: { naca: '0012' },
  tipSection: { naca: '0012' },
};

function readRows<T>(rows: unknown, read: Reader<T>, least: number, most: number): T[] | undefined {
  if (!Array.isArray(rows) || rows.length < least || rows.length > most) return undefined;
  const good: T[] = [];
  for (const row of rows) {
    const one = read(row);
    if (one === undefined) return undefined;
    good.push(one);
  }
  return good;
}

const readSurface: Reader<Plan['surfaces'][number]> = (value) => {
  if (typeof value !== 'object' || value === null) return undefined;
  const { panels, parts } = value as { panels?: unknown; parts?: unknown };
  const frame = surface.safeParse({ ...value, panels: [SOME_PANEL], parts: [] }).data;
  const [goodPanels, goodParts] = [
    readRows(panels, readPanel, 1, LIMITS.panels.max),
    readRows(parts, readPart, 0, LIMITS.parts.max),
  ];
  return frame && goodPanels && goodParts && { ...frame, panels: goodPanels, parts: goodParts };
};

/**
 * The plan as the schema reads it, by its pieces; null where any is refused: then the schema itself has to say what is
 * wrong with it.
 */
export function checkedQuickly(plan: unknown): Plan | null {
  if (typeof plan !== 'object' || plan === null) return null;
  const { materials, surfaces, items, solids } = plan as { [K in keyof Plan]?: unknown };
  const frame = planSchema.safeParse({ ...plan, materials: {}, surfaces: [], items: [], solids: [] }).data;
  const pieces = {
    materials: readMaterials(materials),
    surfaces: readRows(surfaces, readSurface, 0, LIMITS.surfaces.max),
    items: readRows(items, readItem, 0, LIMITS.items.max),
    solids: readRows(solids, readSolid, 0, LIMITS.solids.max),
  };
  if (!frame || !pieces.materials || !pieces.surfaces || !pieces.items || !pieces.solids) return null;
  if (referenceIssues(plan).length > 0) return null;
  const { materials: m, surfaces: s, items: i, solids: o } = pieces;
  return { ...frame, materials: m, surfaces: s, items: i, solids: o };
}
