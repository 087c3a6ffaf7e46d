import { ribStations, stripAt } from '#shared/core/half.ts';
import type { Pair, Part, Ribs, Skin, Strip, Surface, TipBlock, Web } from '#shared/core/plan.ts';
import { pairAt, stationAt, type Station, type SurfaceLine } from '#shared/core/stations.ts';
import { changeParts, type Recipe } from '../edits/plan-edits.ts';
import { withRow } from '../edits/rows.ts';
import { LEAST, type Handle, type Reach } from './handle.ts';

interface Ground {
  surface: Surface;
  index: number;
  line: SurfaceLine;
  /** stations of ribs and panel ends, which ends of parts fall onto */
  marks: readonly number[];
}

/** What can be taken hold of on the picked part. */
export function partHandles(ground: Ground, part: Part): Handle[] {
  switch (part.kind) {
    case 'ribs':
      return ribHandles(ground, part);
    case 'strip':
    case 'web':
      return lineHandles(ground, part);
    case 'skin':
      return skinHandles(ground, part);
    case 'tipBlock':
      return [tipHandle(ground, part)];
    default:
      return [];
  }
}

/** Changes the part as it is when the change is made. */
function change<P extends Part>({ index }: Ground, part: P, fn: (part: P) => P): Recipe {
  return changeParts(index, (parts) =>
    withRow(parts, part.id, (now) => (now.kind === part.kind ? fn(now as P) : now)),
  );
}

/** Each rib at its trailing edge. A rib of an even row that is moved takes the row apart into single stations. */
function ribHandles(ground: Ground, part: Ribs): Handle[] {
  const { line } = ground;
  const breaks = line.panels.map(({ end }) => end);
  return ribStations(part).flatMap((s, i): Handle[] => {
    if (s > line.length) return [];
    const station = stationAt(line, s);
    const reach: Reach = {
      value: s,
      min: 0,
      max: line.length,
      marks: breaks,
      word: 'from the root',
      set: (value) => change(ground, part, (ribs) => withRib(ribs, i, value)),
    };
    return [
      { id: `rib ${i}`, name: `${part.name}, ${i + 1}`, at: [trailingEdge(station), s], reach: { s: reach } },
    ];
  });
}

function withRib(ribs: Ribs, at: number, s: number): Ribs {
  const { from: _from, to: _to, count: _count, ...rest } = ribs;
  return { ...rest, stations: ribStations(ribs).map((before, i) => (i === at ? s : before)) };
}

/** Both ends of a spar, stringer, edge or web: along the span, and along the chord where it has a place of its own. */
function lineHandles(ground: Ground, part: Strip | Web): Handle[] {
  const { at } = part;
  const own = at !== undefined && (part.kind === 'web' || (part.seat !== 'nose' && part.seat !== 'tail'));
  return endsOf(ground, part, (station, end) => {
    const centre = part.kind === 'web' ? webCentre(part, station) : stripAt(part, station).centre;
    if (!own || station.chord <= 0) return { centre };
    const x: Reach = {
      value: centre,
      min: 0,
      max: station.chord,
      marks: [],
      word: 'behind the leading edge',
      set: (value) => change(ground, part, (p) => ({ ...p, at: withEnd(p.at, end, value / station.chord) })),
    };
    return { centre, x };
  });
}

const webCentre = (web: Web, { s, chord }: Station) => pairAt(web.at, web.from, web.to, s) * chord;

/** Where sheeting begins and ends along the span, taken hold of in its middle. */
function skinHandles(ground: Ground, part: Skin): Handle[] {
  const middle = part.seat === 'wrap' ? part.start / 2 : (part.start + part.end) / 2;
  return endsOf(ground, part, ({ chord }) => ({ centre: middle * chord }));
}

/** Both ends of a part that runs along the span; `across` says where on the chord they are taken hold of. */
function endsOf(
  ground: Ground,
  part: Strip | Web | Skin,
  across: (station: Station, end: 0 | 1) => { centre: number; x?: Reach },
): Handle[] {
  const { line, marks } = ground;
  return ([0, 1] as const).flatMap((end): Handle[] => {
    const key = end === 0 ? 'from' : 'to';
    const s = part[key];
    if (s > line.length || part.from > part.to) return [];
    const station = stationAt(line, s);
    const { centre, x } = across(station, end);
    const along: Reach = {
      value: s,
      min: end === 0 ? 0 : part.from + LEAST,
      max: end === 0 ? part.to - LEAST : line.length,
      marks,
      word: 'from the root',
      set: (value) => change(ground, part, (p) => ({ ...p, [key]: value })),
    };
    const name = `${part.name}, ${end === 0 ? 'inner' : 'outer'} end`;
    return [{ id: key, name, at: [station.leadingEdge + centre, s], reach: { s: along, ...(x && { x }) } }];
  });
}

/** Ten-thousandths of the chord are finer than any pencil. */
function withEnd(pair: Pair | undefined, end: 0 | 1, share: number): Pair {
  const [a, b] = pair ?? [0, 0];
  const rounded = Math.round(share * 1e4) / 1e4;
  return end === 0 ? [rounded, b] : [a, rounded];
}

/** The outermost place of a tip block, along the middle of the last chord. */
function tipHandle(ground: Ground, part: TipBlock): Handle {
  const { line } = ground;
  const last = stationAt(line, line.length);
  const reach: Reach = {
    value: part.length,
    min: LEAST,
    max: line.length,
    marks: [],
    word: 'long',
    set: (length) => change(ground, part, (p) => ({ ...p, length })),
  };
  const at = [last.leadingEdge + last.chord / 2, line.length + part.length] as const;
  return { id: 'tip', name: part.name, at, reach: { s: reach } };
}

const trailingEdge = (station: Station) => station.leadingEdge + station.chord;
