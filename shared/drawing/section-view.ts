import type { Half } from '#shared/core/half.ts';
import type { Plan, Surface, TipBlock } from '#shared/core/plan.ts';
import { heightAt } from '#shared/core/section-integrals.ts';
import { stationAt, type Station } from '#shared/core/stations.ts';
import { contourOf } from './contour.ts';
import type { SideName } from './frames.ts';
import { sectionOf } from './section-parts.ts';
import { tipContour, tipShare } from './section-tip.ts';
import { shapeMaterial, type Point, type Shape, type ShapeKind } from './shape.ts';
import { layOut } from './surface-view.ts';

/** A surface cut at a station, looked at from the tip of the half: x mm aft of the leading edge there, z up. */
export interface SectionView {
  s: number;
  chord: number;
  /** where the chord begins, mm behind the leading edge; only a tip block's lies elsewhere than there */
  front: number;
  /** greatest thickness, mm, and where it lies, x/c */
  thickness: number;
  thicknessAt: number;
  /** id of the ribs of which one stands here; null between ribs */
  rib: string | null;
  /** lowest first */
  shapes: Shape[];
}

const LAYERS: readonly ShapeKind[] = [
  'ribs',
  'sheet',
  'lightening',
  'skin',
  'capStrips',
  'notch',
  'web',
  'strip',
  'stock',
  'outline',
  'finish',
  'covering',
];

/** The section of a surface at station `s`, with everything that is cut there. */
export function sectionView(
  surface: Surface,
  s: number,
  materials: Plan['materials'],
  side: SideName = 'starboard',
): SectionView {
  const half = layOut(surface, side);
  const { length } = half.line;
  const tip = tipBlockOf(half);
  if (tip && s > length) return tipView(half, tip, Math.min(s - length, tip.length), materials);
  const station = stationAt(half.line, Math.min(length, Math.max(0, s)));
  const rib = half.ribs.find(({ part, stations }) =>
    stations.some((r) => Math.abs(r.s - station.s) <= part.thickness / 2 + 1e-6),
  )?.part;
  const shapes = half.parts.flatMap((part) =>
    sectionOf(half, part, station, rib).map((drawn): Shape => {
      const line = `${surface.key}/${part.id}`;
      const plain = drawn.kind === 'stock' || drawn.kind === 'notch' || drawn.kind === 'lightening';
      const material = plain ? null : shapeMaterial(materials, part.material);
      return { line, material, closed: true, hidden: false, ...drawn };
    }),
  );
  const layered = [...shapes, outlineOf(contourOf(station))].sort(
    (a, b) => LAYERS.indexOf(a.kind) - LAYERS.indexOf(b.kind),
  );
  return {
    s: station.s,
    chord: station.chord,
    front: 0,
    ...greatestThickness(station),
    rib: rib ? `${surface.key}/${rib.id}` : null,
    shapes: layered,
  };
}

const outlineOf = (points: Point[]): Shape => ({
  kind: 'outline',
  line: null,
  points,
  closed: true,
  material: null,
  hidden: false,
});

/** The longest tip block of a half: what is cut beyond the last station. */
function tipBlockOf(half: Half): TipBlock | undefined {
  const tips = half.parts.filter((part) => part.kind === 'tipBlock');
  return tips.reduce<TipBlock | undefined>((a, b) => (a && a.length >= b.length ? a : b), undefined);
}

/** A tip block cut `beyond` mm outside the last station. */
function tipView(half: Half, tip: TipBlock, beyond: number, materials: Plan['materials']): SectionView {
  const last = stationAt(half.line, half.line.length);
  const share = tipShare(beyond, tip.length);
  const points = tipContour(last, share);
  const full = greatestThickness(last);
  const block: Shape = {
    ...outlineOf(points),
    kind: 'tipBlock',
    line: `${half.surface.key}/${tip.id}`,
    material: shapeMaterial(materials, tip.material),
  };
  return {
    s: last.s + beyond,
    chord: last.chord * share,
    front: Math.min(...points.map(([x]) => x)),
    thickness: full.thickness * share,
    thicknessAt: full.thicknessAt,
    rib: null,
    shapes: share > 0 ? [block, outlineOf(points)] : [],
  };
}

function greatestThickness({ section, chord }: Station): { thickness: number; thicknessAt: number } {
  let [thickness, thicknessAt] = [0, 0];
  for (const x of section.x) {
    const height = heightAt(section, x) * chord;
    if (height > thickness + 1e-9) [thickness, thicknessAt] = [height, x];
  }
  return { thickness, thicknessAt };
}
