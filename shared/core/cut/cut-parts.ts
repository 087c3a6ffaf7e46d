import { sidedLines, type BuiltSide } from '../built/sided-lines.ts';
import type { Plan } from '../plan.ts';
import { pointOf, stationAt, surfaceLine, type SurfaceLine } from '../stations.ts';
import { woodGroupKey } from '../wood-groups.ts';
import { cutList } from './cut-list.ts';
import { sheetBlanks, type GrainWish } from './sheet-blanks.ts';

/** A wooden piece to be cut, as far as it matters which stock it comes from. Lengths mm. */
export interface CutPart {
  id: string;
  /** id of the estimate's line, and which of its pieces on both sides together, from 0 */
  line: string;
  n: number;
  name: string;
  /** of several alike, which: the rib from the root, the panel, the bay; null where there is one */
  number: number | null;
  side: BuiltSide;
  /** null outside a surface */
  surface: string | null;
  form: 'sheet' | 'stick';
  length: number;
  width: number;
  thickness: number;
  /** of the finished piece, mm³ */
  volume: number;
  /** its distance from the middle of the model, mm */
  y: number;
  isSpar: boolean;
  grain: GrainWish;
  /** key in the plan's materials, what wood that is, and its density, kg/m³ */
  material: string;
  wood: string;
  density: number;
}

/** Wider strips are cut from sheet, mm (common practice, no source: sticks are sold up to half an inch). */
export const WIDEST_STICK = 13;

/** What is thicker is a block, mm (common practice, no source: sheet is sold up to half an inch). */
export const THICKEST_SHEET = 13;

/**
 * Which wood a name means, whatever its grade: what stands before the first comma or bracket.
 * @example woodOf('Balsa, medium-hard') // → 'balsa'
 */
export const woodOf = (name: string): string => (/^[^,(]*/.exec(name)?.[0] ?? '').trim().toLowerCase();

type Piece = Omit<CutPart, 'n' | 'volume' | 'y' | 'isSpar' | 'wood' | 'density'> & {
  /** middle along the half span; null outside a surface */
  station: number | null;
};

/**
 * Every wooden piece that a plan is cut as, with its finished volume and its arm about the middle. A line's volume on
 * a side is shared among its pieces by the size of their blanks.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example cutParts(EXAMPLE_PLAN).filter(({ line }) => line === 'wing/spar').map(({ id, volume, y }) => [id, volume, y]) // → [['wing/spar port', 5000, 250], ['wing/spar starboard', 5000, 250]]
 */
export function cutParts(plan: Plan): CutPart[] {
  const pieces = piecesOf(plan).filter(({ material }) => plan.materials[material]?.category === 'wood');
  const volumes = volumesBySide(plan);
  const size = ({ length, width, thickness }: Piece) => length * width * thickness;
  const sums = new Map<string, number>();
  for (const piece of pieces) sums.set(sideKey(piece), (sums.get(sideKey(piece)) ?? 0) + size(piece));
  const lines = new Map(plan.surfaces.map((surface) => [surface.key, surfaceLine(surface)]));
  const spars = sparLines(plan);
  const counts = new Map<string, number>();
  return pieces.map(({ station, ...piece }): CutPart => {
    const n = counts.get(piece.line) ?? 0;
    counts.set(piece.line, n + 1);
    const share = size({ ...piece, station }) / (sums.get(sideKey(piece)) || 1);
    const { name = '', density = 0 } = plan.materials[piece.material] ?? {};
    return {
      ...piece,
      n,
      volume: (volumes.get(sideKey(piece)) ?? 0) * share,
      y: distance(lines.get(piece.surface ?? ''), station),
      isSpar: spars.has(piece.line),
      wood: woodOf(name),
      density,
    };
  });
}

const sideKey = ({ line, side }: { line: string; side: BuiltSide }) => `${line} ${side}`;

function piecesOf(plan: Plan): Piece[] {
  const { sticks, ribs } = cutList(plan);
  const keys = new Set(plan.surfaces.map(({ key }) => key));
  const surfaceOf = (line: string) => {
    const key = line.slice(0, line.indexOf('/'));
    return keys.has(key) ? key : null;
  };
  return [
    ...sticks.map(({ panel, place: _, ...stick }): Piece => {
      const form = stick.width > WIDEST_STICK ? 'sheet' : 'stick';
      return { ...stick, number: panel, form, surface: surfaceOf(stick.line), grain: null };
    }),
    ...ribs.map(({ height, ...rib }): Piece => {
      const surface = surfaceOf(rib.line);
      return { ...rib, width: height, form: 'sheet', surface, grain: 'stiff' };
    }),
    ...sheetBlanks(plan).map(({ number, of, ...blank }): Piece => {
      return { ...blank, number: of > 1 ? number : null, form: 'sheet' };
    }),
  ];
}

function volumesBySide(plan: Plan): ReadonlyMap<string, number> {
  return new Map(
    sidedLines(plan).map((line) => {
      const density = plan.materials[line.material ?? '']?.density ?? 0;
      return [sideKey(line), density > 0 ? (line.mass / density) * 1e6 : 0];
    }),
  );
}

function distance(line: SurfaceLine | undefined, station: number | null): number {
  if (!line || station === null) return 0;
  return Math.abs(pointOf(stationAt(line, station), 0, 0)[1]);
}

function sparLines(plan: Plan): ReadonlySet<string> {
  return new Set(
    plan.surfaces.flatMap(({ key, role, parts }) =>
      role === 'wing'
        ? parts.filter((part) => woodGroupKey(part) === 'spars').map(({ id }) => `${key}/${id}`)
        : [],
    ),
  );
}
