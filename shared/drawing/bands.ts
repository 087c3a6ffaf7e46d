import { stationAt, type Station, type SurfaceLine } from '#shared/core/stations.ts';
import type { Frame } from './frames.ts';
import type { Point } from './shape.ts';

/** Stations from `from` to `to`, each panel's own at a break, `steps` to a panel. The range is clipped. */
export function stationsAlong(line: SurfaceLine, from: number, to: number, steps = 1): Station[] {
  const [low, high] = [Math.max(0, Math.min(from, to)), Math.min(line.length, Math.max(from, to))];
  return line.panels.flatMap((panel) => {
    const [a, b] = [Math.max(low, panel.start), Math.min(high, panel.end)];
    if (b <= a) return [];
    return Array.from({ length: steps + 1 }, (_, i) => stationAt(line, a + ((b - a) * i) / steps, panel));
  });
}

/** Area in plan between two lines along a surface, each given as mm behind the leading edge at a station. */
export function bandOf(
  stations: readonly Station[],
  frame: Frame,
  front: (station: Station) => number,
  back: (station: Station) => number,
): Point[] {
  const out = stations.map((station) => frame(station, front(station)));
  const home = stations.map((station) => frame(station, back(station))).reverse();
  return [...out, ...home];
}

/** A piece that stands at one station, `thickness` mm along s, from `front` to `back` behind the leading edge. */
export function pieceAt(
  station: Station,
  thickness: number,
  front: number,
  back: number,
  frame: Frame,
): Point[] {
  const half = thickness / 2;
  return [
    frame(station, front, 0, -half),
    frame(station, front, 0, half),
    frame(station, back, 0, half),
    frame(station, back, 0, -half),
  ];
}
