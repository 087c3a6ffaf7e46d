import { stripAt, type Half } from './half.ts';
import type { Strip, Web } from './plan.ts';
import { pairAt, stationAt, type Station, type SurfaceLine } from './stations.ts';

/*
 * Stations where what is integrated along a surface jumps: a strip that slips out from under a skin, a web that
 * leaves a strip. Integrals are split there, for a sample rule holds only where the integrand is smooth.
 */

/**
 * Stations, mm, between `from` and `to` where `f` changes its sign, found by halving. Each panel is looked at in
 * `pieces` equal steps: two changes within one step go unseen.
 * @example signChanges(EXAMPLE_LINE, 0, 500, 1, ({ s }) => s - 200) // → [200]
 */
export function signChanges(
  line: SurfaceLine,
  from: number,
  to: number,
  pieces: number,
  f: (station: Station) => number,
): number[] {
  const found: number[] = [];
  for (const panel of line.panels) {
    const [a, b] = [Math.max(from, panel.start), Math.min(to, panel.end)];
    if (b <= a) continue;
    let low = a;
    let atLow = f(stationAt(line, low, panel));
    for (let i = 1; i <= pieces; i++) {
      const high = a + ((b - a) * i) / pieces;
      const atHigh = f(stationAt(line, high, panel));
      if (atLow * atHigh < 0) found.push(bisect((s) => f(stationAt(line, s, panel)), low, high, atLow));
      low = high;
      atLow = atHigh;
    }
  }
  return found;
}

function bisect(f: (s: number) => number, from: number, to: number, atFrom: number): number {
  let [low, high] = [from, to];
  // 50 halvings take any panel below a billionth of a millimetre.
  for (let i = 0; i < 50; i++) {
    const middle = (low + high) / 2;
    if (f(middle) * atFrom > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Stations, mm, where skins over a strip begin, end or slip off its centre line; in no order, some perhaps twice or
 * outside `from` and `to`, as `samplesOver` takes them.
 * @example breaksUnderSkins(EXAMPLE_HALF, EXAMPLE_SPAR, 0, 500) // → [0, 500]
 */
export function breaksUnderSkins(half: Half, strip: Strip, from: number, to: number): number[] {
  const { at, seat } = strip;
  const isAlongEdges = seat !== 'nose' && seat !== 'tail' && at !== undefined && at[0] === at[1];
  if (isAlongEdges) return half.skinEnds;
  // The centre line's x/c is linear (or, on an edge, its distance to the skin's edge): one crossing at the most.
  const crossings = half.skinEdges.flatMap((edge) =>
    signChanges(half.line, from, to, 1, (station) => stripAt(strip, station).centre - edge * station.chord),
  );
  return [...half.skinEnds, ...crossings];
}

/**
 * Stations, mm, where skins or strips over a web begin, end or slip off it; in no order, as those of a strip.
 * @example breaksOverWeb(EXAMPLE_HALF, EXAMPLE_WEB, 0, 500) // → [0, 500, 0, 500]
 */
export function breaksOverWeb(half: Half, web: Web, from: number, to: number): number[] {
  const x = (station: Station) => pairAt(web.at, web.from, web.to, station.s);
  // A web square to the root stays on its side of every edge.
  const edges = web.at[0] === web.at[1] ? [] : half.skinEdges;
  const skins = edges.flatMap((edge) => signChanges(half.line, from, to, 1, (station) => x(station) - edge));
  const strips: number[] = [];
  for (const strip of half.strips) {
    const [low, high] = [Math.max(from, strip.from), Math.min(to, strip.to)];
    strips.push(strip.from, strip.to);
    if (low >= high) continue;
    for (const sign of [1, -1]) {
      const changes = signChanges(half.line, low, high, 4, (station) => {
        const { centre, width } = stripAt(strip, station);
        return centre - x(station) * station.chord + (sign * width) / 2;
      });
      strips.push(...changes);
    }
  }
  return [...half.skinEnds, ...skins, ...strips];
}
