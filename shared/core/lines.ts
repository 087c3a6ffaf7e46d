import { gramsOfArea, gramsOfVolume, type Vec3 } from './frame.ts';
import { halfOf, type Half } from './half.ts';
import { centroid, emptyLump, mirrorLump, scaleLump, sumLumps, type Lump } from './lump.ts';
import type { Notice } from './notices.ts';
import type { RememberedPart } from './part-memory.ts';
import { measureJoints } from './parts/glue.ts';
import type { Basis, Measure } from './parts/measure.ts';
import { measureSheet, measureTipBlock } from './parts/plate.ts';
import { measureRibs } from './parts/ribs.ts';
import { measureCapStrips, measureCovering, measureSkin } from './parts/skin.ts';
import { measureStrip } from './parts/strip.ts';
import { measureWeb } from './parts/web.ts';
import type { Glue, Item, Part, Plan, PlanMaterial, Solid, Surface } from './plan.ts';
import type { Line } from './result.ts';
import { measureSolid } from './solids.ts';
import { stationAt, type SurfaceLine } from './stations.ts';

/** A line of the balance sheet with the mass moments that the totals need. The lump is in g. */
export interface LineWithLump {
  line: Line;
  lump: Lump;
}

type Tell = (notice: Notice) => void;
type SolidPart = Exclude<Part, Glue>;

/** Of a material with both figures the density counts; covering and finish always go by area. */
const basisOf = (material: PlanMaterial): Basis => (material.density === undefined ? 'area' : 'volume');

function measurePart(half: Half, part: SolidPart, basis: Basis): Measure {
  switch (part.kind) {
    case 'ribs':
      return measureRibs(half, part, basis);
    case 'strip':
      return measureStrip(half, part, basis);
    case 'skin':
      return measureSkin(half, part, basis);
    case 'capStrips':
      return measureCapStrips(half, part, basis);
    case 'web':
      return measureWeb(half, part, basis);
    case 'tipBlock':
      return measureTipBlock(half, part);
    case 'sheet':
      return measureSheet(half, part, basis);
    case 'covering':
    case 'finish':
      return measureCovering(half, part);
  }
}

const both = (a: number | null, b: number | null) => (a === null || b === null ? null : a + b);

function join(measures: readonly Measure[]): Measure {
  return measures.reduce((a, b) => ({
    pieces: a.pieces + b.pieces,
    length: both(a.length, b.length),
    area: both(a.area, b.area),
    volume: both(a.volume, b.volume),
    lump: sumLumps([a.lump, b.lump]),
  }));
}

/** Both halves of a surface as far as they differ: where no part is one-sided, one half serves for both. */
function halvesOf(surface: Surface, line: SurfaceLine, tell: Tell): { starboard: Half; port: Half | null } {
  const starboard = halfOf(surface, line, 'starboard', tell);
  if (!surface.mirrored) return { starboard, port: null };
  const oneSided = surface.parts.some((part) => part.side === 'port' || part.side === 'starboard');
  return { starboard, port: oneSided ? halfOf(surface, line, 'port', tell) : starboard };
}

/** Measures a part on the halves that it is on; the port half is the mirror image of its own starboard layout. */
function measureOn(
  halves: { starboard: Half; port: Half | null },
  part: { side?: Part['side'] },
  measure: (half: Half) => Measure,
): Measure {
  const side = part.side ?? 'both';
  const done: Measure[] = [];
  if (side !== 'port') done.push(measure(halves.starboard));
  if (halves.port && side !== 'starboard') {
    const first = done[0];
    const own = halves.port === halves.starboard && first ? first : measure(halves.port);
    done.push({ ...own, lump: mirrorLump(own.lump) });
  }
  return join(done);
}

/**
 * Lines of all parts of a surface, in their order, both halves of a mirrored one in one line. Glue is measured
 * last, for its share is of the mass of the wood. `tell` hears of every part that does not fit or comes to nothing.
 * @throws RangeError when the plan has no material under a part's key
 * @example surfaceLines(EXAMPLE_PLAN, EXAMPLE_WING, EXAMPLE_LINE, () => undefined).map(({ line }) => line.mass) // → [2.256, 1, 5]
 */
export function surfaceLines(plan: Plan, surface: Surface, line: SurfaceLine, tell: Tell): LineWithLump[] {
  return measureParts(plan, surface, line, tell, () => undefined).lines;
}

/**
 * The same with what is worth remembering of each part. What `known` knows of a part is taken over, and told again.
 * @throws RangeError when the plan has no material under a part's key
 * @example measureParts(EXAMPLE_PLAN, EXAMPLE_WING, EXAMPLE_LINE, () => undefined, () => undefined).known.size // → 3
 */
export function measureParts(
  plan: Plan,
  surface: Surface,
  line: SurfaceLine,
  tellAll: Tell,
  knownOf: (part: Part, material: PlanMaterial) => RememberedPart | undefined,
): { lines: LineWithLump[]; known: Map<Part, RememberedPart> } {
  let notices: Notice[] = [];
  const tell = (notice: Notice) => {
    notices.push(notice);
    tellAll(notice);
  };
  const known = new Map<Part, RememberedPart>();
  const halves = halvesOf(surface, line, tell);
  const apex = stationAt(line, 0);
  const root: Vec3 = [apex.leadingEdge, surface.mirrored ? 0 : apex.panel.y, apex.panel.z];
  const done = new Map<Part, LineWithLump>();
  const lineOf = (part: Part, measure: Measure, grams: Lump, cv: number) => {
    if (grams.amount <= 0) tell({ code: 'part_measures_nothing', path: `${surface.key}/${part.id}` });
    const group = part.group ?? surface.key;
    const { name, material } = part;
    const head = { id: `${surface.key}/${part.id}`, name, group, surface: surface.key, material };
    return makeLine(head, measure, grams, cv, root);
  };
  const measured = (part: SolidPart, material: PlanMaterial) => {
    const basis = part.kind === 'covering' || part.kind === 'finish' ? 'area' : basisOf(material);
    const measure = measureOn(halves, part, (half) => measurePart(half, part, basis));
    return lineOf(part, measure, inGrams(measure.lump, basis, material), material.cv);
  };
  for (const part of surface.parts) {
    if (part.kind === 'glue') continue;
    const material = materialOf(plan, part.material);
    const before = knownOf(part, material);
    if (before) before.notices.forEach(tellAll);
    const told = (notices = []);
    const entry = before?.entry ?? measured(part, material);
    known.set(part, before ?? { material, entry, notices: told });
    done.set(part, entry);
  }
  // What is told of glue is no part's that is remembered.
  notices = [];
  const wood = [...done].filter(([part]) => materialOf(plan, part.material).category === 'wood');
  for (const part of surface.parts) {
    if (part.kind !== 'glue') continue;
    const material = materialOf(plan, part.material);
    if (part.method === 'joints') {
      const measure = measureOn(halves, part, measureJoints);
      const spread = (material.spread ?? 0) * (part.layers ?? 1);
      done.set(part, lineOf(part, measure, scaleLump(measure.lump, gramsOfArea(1, spread)), material.cv));
    } else {
      const share = scaleLump(sumLumps(wood.map(([, { lump }]) => lump)), part.share ?? 0);
      if (wood.length === 0) tell({ code: 'share_of_no_wood', path: `${surface.key}/${part.id}` });
      const none: Measure = { pieces: 1, length: null, area: null, volume: null, lump: emptyLump() };
      done.set(part, lineOf(part, none, share, material.cv));
    }
  }
  return { lines: surface.parts.flatMap((part) => done.get(part) ?? []), known };
}

/**
 * Line of a stick, block or plate outside a surface.
 * @throws RangeError when the plan has no material under the solid's key
 * @example solidLine(EXAMPLE_PLAN, EXAMPLE_PLAN.solids[0], () => undefined).line.mass // → 1
 */
export function solidLine(plan: Plan, solid: Solid, tell: Tell): LineWithLump {
  const material = materialOf(plan, solid.material);
  const basis = solid.shape === 'bar' ? 'volume' : basisOf(material);
  const measure = measureSolid(solid, basis, tell);
  const { id, name, group, material: key } = solid;
  const at: Vec3 =
    solid.shape === 'bar' ? solid.from : [solid.outline[0]?.[0] ?? 0, solid.y, solid.outline[0]?.[1] ?? 0];
  const head = { id: `solid/${id}`, name, group, surface: null, material: key };
  return makeLine(head, measure, inGrams(measure.lump, basis, material), material.cv, at);
}

/**
 * Line of whatever has a mass and an arm: a point, with the uncertainty that the item gives (0 where it gives
 * none).
 * @example itemLine(EXAMPLE_PLAN.items[0]).line.moment // → -200
 */
export function itemLine(item: Item): LineWithLump {
  const { id, name, group, mass, u = 0, at } = item;
  const lump = emptyLump();
  lump.amount = mass;
  for (const axis of [0, 1, 2] as const) {
    lump.first[axis] = mass * at[axis];
    lump.second[axis] = mass * at[axis] ** 2;
  }
  const none: Measure = { pieces: 1, length: null, area: null, volume: null, lump };
  const made = makeLine({ id: `item/${id}`, name, group, surface: null, material: null }, none, lump, 0, at);
  return { ...made, line: { ...made.line, u } };
}

function makeLine(
  head: Pick<Line, 'id' | 'name' | 'group' | 'surface' | 'material'>,
  measure: Measure,
  grams: Lump,
  cv: number,
  otherwiseAt: Vec3,
): LineWithLump {
  const { pieces, length, area, volume } = measure;
  const at = centroid(grams) ?? otherwiseAt;
  const { id, name, group, surface, material } = head;
  const line: Line = {
    id,
    name,
    group,
    surface,
    material,
    pieces,
    length,
    area,
    volume,
    mass: grams.amount,
    u: grams.amount * cv,
    at: [at[0], at[1], at[2]],
    moment: grams.first[0],
  };
  return { line, lump: grams };
}

function inGrams(lump: Lump, basis: Basis, material: PlanMaterial): Lump {
  const factor =
    basis === 'volume' ? gramsOfVolume(1, material.density ?? 0) : gramsOfArea(1, material.areal ?? 0);
  return scaleLump(lump, factor);
}

function materialOf(plan: Plan, key: string): PlanMaterial {
  const material = plan.materials[key];
  if (!material) throw new RangeError(`the plan has no material “${key}”`);
  return material;
}
