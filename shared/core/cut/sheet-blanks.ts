import type { BuiltSide } from '../built/sided-lines.ts';
import { developedAt } from '../fit.ts';
import { halfOf, type Half } from '../half.ts';
import { webRoom } from '../parts/web.ts';
import type { Plan, Plate, Sheet, Skin, Surface, Web } from '../plan.ts';
import { stationAt, surfaceLine, type PanelLine } from '../stations.ts';
import { sidesOf } from './cut-list.ts';

/** How a sheet should have been sawn: one that bends for what is wrapped, a stiff one for what stands upright. */
export type GrainWish = 'bends' | 'stiff' | null;

/** A rectangle of sheet that a part is cut from. Lengths mm. */
export interface SheetBlank {
  id: string;
  line: string;
  name: string;
  side: BuiltSide;
  /** which of the line's blanks on its side, from 1, and of how many */
  number: number;
  of: number;
  material: string;
  /** along the grain, and across it */
  length: number;
  width: number;
  thickness: number;
  grain: GrainWish;
  /** middle along the half span, from the root; null outside a surface */
  station: number | null;
  surface: string | null;
}

/** What is wider is joined from strips of equal width: sheet is sold up to 4 in (common practice, no source). */
export const WIDEST_SHEET = 101.6;

/** Stations that a blank's width is looked for at. */
const LOOKS = 24;

type Rectangle = Pick<SheetBlank, 'length' | 'width' | 'station'>;

/**
 * Blanks of sheet for skins, webs and flat surfaces, port and starboard each by name, and for plates. Skins and flat
 * surfaces are cut at the breaks between panels, grain along the span; a web has a blank for each bay, grain upright.
 * @example sheetBlanks(EXAMPLE_PLAN).map(({ id, length, width }) => [id, length, Math.round(width)]) // → [['wing/skin port 1', 500, 50], ['wing/skin starboard 1', 500, 50]]
 */
export function sheetBlanks(plan: Plan): SheetBlank[] {
  const blanks: SheetBlank[] = [];
  for (const surface of plan.surfaces) {
    const half = halfOf(surface, surfaceLine(surface), 'starboard', () => undefined);
    for (const part of surface.parts) {
      if (part.kind !== 'skin' && part.kind !== 'web' && part.kind !== 'sheet') continue;
      const rectangles = rectanglesOf(half, part);
      for (const side of sidesOf(surface, part.side)) {
        blanks.push(...blanksOf(surface, part, side, rectangles));
      }
    }
  }
  for (const solid of plan.solids) if (solid.shape === 'plate') blanks.push(...plateBlanks(solid));
  return blanks;
}

function rectanglesOf(half: Half, part: Skin | Web | Sheet): Rectangle[] {
  switch (part.kind) {
    case 'skin':
      return panelsOver(half, part.from, part.to).flatMap(([panel, from, to]) =>
        strips(
          to - from,
          widest(from, to, (s) => developedAt(part, stationAt(half.line, s, panel)).amount),
          (from + to) / 2,
        ),
      );
    case 'sheet':
      return panelsOver(half, 0, half.line.length).flatMap(([panel, from, to]) =>
        strips(to - from, Math.max(...panel.chord), (from + to) / 2),
      );
    case 'web':
      return bays(half, part);
  }
}

function panelsOver(half: Half, from: number, to: number): [panel: PanelLine, from: number, to: number][] {
  return half.line.panels.flatMap((panel): [PanelLine, number, number][] => {
    const [start, end] = [Math.max(from, panel.start), Math.min(to, panel.end)];
    return end > start ? [[panel, start, end]] : [];
  });
}

function widest(from: number, to: number, at: (s: number) => number): number {
  let width = 0;
  for (let i = 0; i <= LOOKS; i++) width = Math.max(width, at(from + ((to - from) * i) / LOOKS));
  return width;
}

/** A rectangle, or strips of it side by side where no sheet is so wide. */
function strips(length: number, width: number, station: number): Rectangle[] {
  if (!(width > 0)) return [];
  const count = Math.ceil(width / WIDEST_SHEET - 1e-9);
  return Array.from({ length: count }, () => ({ length, width: width / count, station }));
}

function bays(half: Half, web: Web): Rectangle[] {
  const [from, to] = [web.from, Math.min(web.to, half.line.length)];
  const ribs = half.ribs.flatMap(({ part, stations }) =>
    stations.map(({ s }) => ({ s, half: part.thickness / 2 })),
  );
  const inside = ribs.filter(({ s }) => s > from && s < to).toSorted((a, b) => a.s - b.s);
  const gap = (s: number) => ribs.find((rib) => Math.abs(rib.s - s) < 1e-6)?.half ?? 0;
  const ends = [{ s: from, half: gap(from) }, ...inside, { s: to, half: gap(to) }];
  return ends.slice(1).flatMap((end, i): Rectangle[] => {
    const start = ends[i] ?? end;
    const [a, b] = [start.s + start.half, end.s - end.half];
    if (b - a <= 0) return [];
    const height = widest(a, b, (s) => webRoom(half, web, stationAt(half.line, s)).height);
    return height > 0 ? [{ length: height, width: b - a, station: (a + b) / 2 }] : [];
  });
}

function blanksOf(
  { key }: Surface,
  part: Skin | Web | Sheet,
  side: BuiltSide,
  rectangles: readonly Rectangle[],
): SheetBlank[] {
  const { name, material, thickness } = part;
  const line = `${key}/${part.id}`;
  const grain: GrainWish = part.kind === 'skin' && part.seat === 'wrap' ? 'bends' : null;
  const own = { line, name, side, material, thickness, grain, surface: key, of: rectangles.length };
  return rectangles.map((rectangle, i) => ({
    id: `${line} ${side} ${i + 1}`,
    number: i + 1,
    ...own,
    ...rectangle,
  }));
}

function plateBlanks({ id, name, material, outline, thickness, count }: Plate): SheetBlank[] {
  const extent = (axis: 0 | 1) => {
    const values = outline.map((point) => point[axis]);
    return Math.max(...values) - Math.min(...values);
  };
  const sides = [extent(0), extent(1)];
  const pieces = Array.from({ length: count }, () =>
    strips(Math.max(...sides), Math.min(...sides), 0).map(({ length, width }) => ({ length, width })),
  ).flat();
  const own = { line: `solid/${id}`, name, side: 'middle' as const, material, thickness, grain: null };
  return pieces.map((piece, i) => ({
    id: `solid/${id} middle ${i + 1}`,
    number: i + 1,
    of: pieces.length,
    ...own,
    ...piece,
    station: null,
    surface: null,
  }));
}
