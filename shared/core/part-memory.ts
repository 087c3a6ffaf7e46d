import { ribStations } from './half.ts';
import type { LineWithLump } from './lines.ts';
import type { Notice } from './notices.ts';
import type { Part, PlanMaterial, Skin, Surface } from './plan.ts';
import type { SurfaceLine } from './stations.ts';

/** What one part came to, and what was told of it on the way. */
export interface RememberedPart {
  material: PlanMaterial;
  entry: LineWithLump;
  notices: readonly Notice[];
}

/** The parts of a surface as they were measured last, and what they were measured on. */
export interface PartMemory {
  surface: Surface;
  line: SurfaceLine;
  known: ReadonlyMap<Part, RememberedPart>;
}

type Kind = Part['kind'];

/** The kinds of part that a kind is measured by, beside itself and the surface. Glue is measured by all there are. */
const MEASURED_BY: Record<Exclude<Kind, 'glue'>, readonly Kind[]> = {
  ribs: ['strip', 'skin', 'capStrips'],
  strip: ['strip', 'skin'],
  skin: [],
  capStrips: ['ribs'],
  web: ['strip', 'skin', 'ribs'],
  tipBlock: [],
  sheet: ['tipBlock'],
  covering: ['tipBlock'],
  finish: ['tipBlock'],
};

/** Parts nearer than this, mm, are taken to meet. */
const NEAR = 1e-3;

/**
 * Which parts of a surface are still what they were: those that are the very objects of before, on the same stations,
 * with nothing changed within their reach. Answers what is known of such a part, or undefined. It errs only by
 * forgetting too much: what it answers is what measuring again would, to the last bit.
 * @example stillKnown(undefined, EXAMPLE_WING, EXAMPLE_LINE)(EXAMPLE_SPAR, EXAMPLE_PLAN.materials['balsa']) // → undefined
 */
export function stillKnown(
  before: PartMemory | undefined,
  surface: Surface,
  line: SurfaceLine,
): (part: Part, material: PlanMaterial) => RememberedPart | undefined {
  if (!before || before.line !== line || !sameGround(before.surface, surface)) return () => undefined;
  const [old, now] = [new Set(before.surface.parts), new Set(surface.parts)];
  const gone = before.surface.parts.filter((part) => !now.has(part));
  const come = surface.parts.filter((part) => !old.has(part));
  const changed = [...gone, ...come].map((part) => ({ kind: part.kind, reach: reachOf(part, line.length) }));
  return (part, material) => {
    const known = before.known.get(part);
    if (!known || known.material !== material || part.kind === 'glue') return undefined;
    const kinds = MEASURED_BY[part.kind];
    const reach = reachOf(part, line.length);
    const isConcerned = changed.some((other) => kinds.includes(other.kind) && meet(reach, other.reach));
    return isConcerned ? undefined : known;
  };
}

/** True where only parts were changed, and of these neither the order nor what reaches over the whole surface. */
function sameGround(a: Surface, b: Surface): boolean {
  if (a.key !== b.key || a.mirrored !== b.mirrored) return false;
  // Integrals are split where any skin begins or ends, so skins may change in nothing but thickness and material.
  const [skins, others] = [a, b].map(({ parts }) =>
    parts.filter((part): part is Skin => part.kind === 'skin'),
  );
  if (!skins || !others || skins.length !== others.length) return false;
  if (!skins.every((skin, i) => others[i] !== undefined && sameLayout(skin, others[i]))) return false;
  const [old, now] = [new Set(a.parts), new Set(b.parts)];
  const [kept, still] = [a.parts.filter((part) => now.has(part)), b.parts.filter((part) => old.has(part))];
  return kept.length === still.length && kept.every((part, i) => part === still[i]);
}

const sameLayout = (a: Skin, b: Skin) =>
  a === b ||
  (a.from === b.from &&
    a.to === b.to &&
    a.start === b.start &&
    a.end === b.end &&
    a.seat === b.seat &&
    a.side === b.side);

type Reach = readonly [from: number, to: number];

/** Stations that a part lies on; a part that runs past the tip is taken to lie on it. */
function reachOf(part: Part, length: number): Reach {
  let [low, high] = [-Infinity, Infinity];
  if (part.kind === 'ribs') {
    const stations = ribStations(part);
    [low, high] = [Math.min(...stations), Math.max(...stations)];
  } else if ('to' in part) {
    [low, high] = [Math.min(part.from, part.to), Math.max(part.from, part.to)];
  }
  return [Math.min(low, length), high];
}

const meet = (a: Reach, b: Reach) => a[0] <= b[1] + NEAR && a[1] >= b[0] - NEAR;
