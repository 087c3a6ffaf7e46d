import { ribStations } from '#shared/core/half.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { demoPlan } from '#tests/support/plans.ts';

/** Cuts one part at a station, as a builder does who fits each bay by itself; null where it cannot be cut. */
function cut(part: Part): [Part, Part] | null {
  const named = (half: Part, n: number): Part => ({
    ...half,
    id: `${part.id}-${n}`,
    name: `${part.name} ${n}`,
  });
  if (part.kind === 'ribs') {
    const stations = ribStations(part);
    if (stations.length < 2) return null;
    const { id, name, kind, material, group, thickness, lightening } = part;
    const rest = { id, name, kind, material, group, thickness, lightening };
    const middle = Math.ceil(stations.length / 2);
    return [
      named({ ...rest, stations: stations.slice(0, middle) }, 1),
      named({ ...rest, stations: stations.slice(middle) }, 2),
    ];
  }
  if (part.kind === 'tipBlock' || part.kind === 'sheet' || part.kind === 'glue') return null;
  const s = (part.from + part.to) / 2;
  if (part.to - part.from < 20) return null;
  const first = { ...part, to: s };
  const second = { ...part, from: s };
  if (part.kind !== 'strip') return [named(first, 1), named(second, 2)];
  const middle = ([a, b]: [number, number]) => (a + b) / 2;
  const split = (pair: [number, number]): [[number, number], [number, number]] => [
    [pair[0], middle(pair)],
    [middle(pair), pair[1]],
  ];
  const [width, height, at] = [split(part.width), split(part.height), part.at && split(part.at)];
  const piece = (base: typeof part, i: 0 | 1): Part => ({
    ...base,
    width: width[i],
    height: height[i],
    at: at?.[i],
  });
  return [named(piece({ ...part, to: s }, 0), 1), named(piece({ ...part, from: s }, 1), 2)];
}

/** The largest demo glider with its parts cut into bays and single ribs until the plan has so many lines. */
export function planOfParts(wanted: number): Plan {
  const plan = demoPlan('whimbrel');
  let surfaces = plan.surfaces;
  let lines = surfaces.reduce((sum, s) => sum + s.parts.length, plan.items.length + plan.solids.length);
  const cutOne = (part: Part): Part[] => {
    const pieces = lines < wanted ? cut(part) : null;
    if (pieces) lines += 1;
    return pieces ?? [part];
  };
  let before: number;
  do {
    before = lines;
    surfaces = surfaces.map((surface): Surface => ({ ...surface, parts: surface.parts.flatMap(cutOne) }));
  } while (lines > before);
  return { ...plan, name: `Whimbrel in ${lines} parts`, surfaces };
}
