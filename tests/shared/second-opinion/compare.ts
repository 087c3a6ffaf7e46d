import type { Vec3 } from '#shared/core/frame.ts';
import type { Estimate, Line } from '#shared/core/result.ts';
import type { SecondLine, SecondOpinion } from './summary.ts';

/** Two figures agree within 0.1 %; a place along an axis also within 0.1 mm. */
const SHARE = 1e-3;
const MILLIMETRES = 0.1;
/** Below this a figure is the rounding of a zero. */
const NOTHING = 1e-6;

type Figure = number | null;

/** Everything in which two estimates of a plan differ, in words; empty when they agree. */
export function differences(first: Estimate, second: SecondOpinion): string[] {
  return [
    ...first.lines.flatMap((line) => {
      const other = second.lines.find(({ id }) => id === line.id);
      return other ? lineDifferences(line, other) : [`${line.id}: only in the estimate`];
    }),
    ...second.lines.flatMap(({ id }) =>
      first.lines.some((line) => line.id === id) ? [] : [`${id}: missing`],
    ),
    ...planformDifferences(first.planform, second.planform),
    ...totalDifferences(first, second),
  ];
}

function lineDifferences(line: Line, other: SecondLine): string[] {
  const id = line.id;
  const measures = (['length', 'area', 'volume'] as const).flatMap((field) =>
    figure(`${id} ${field}`, line[field], other[field]),
  );
  const size = Math.abs(line.mass) * MILLIMETRES;
  return [
    ...(line.pieces === other.pieces ? [] : [`${id} pieces: ${line.pieces} and ${other.pieces}`]),
    ...(line.group === other.group ? [] : [`${id} group: ${line.group} and ${other.group}`]),
    ...measures,
    ...figure(`${id} mass`, line.mass, other.mass),
    ...figure(`${id} u`, line.u, other.u),
    ...place(`${id} at`, line.at, other.at),
    ...figure(`${id} moment`, line.moment, other.moment, size),
  ];
}

function totalDifferences(first: Estimate, second: SecondOpinion): string[] {
  const { at, inertia, byGroup, ...totals } = first.totals;
  const { at: at2, inertia: inertia2, byGroup: byGroup2, ...totals2 } = second.totals;
  const plain = (path: string, a: Figure, b: Figure) => figure(path, a, b);
  return [
    ...record('totals', { ...totals }, { ...totals2 }, plain),
    ...record('byGroup', byGroup, byGroup2, plain),
    ...(at && at2 ? place('totals at', at, at2) : at === at2 ? [] : ['totals at: only in one']),
    ...(inertia && inertia2
      ? record('inertia', { ...inertia }, { ...inertia2 }, plain)
      : inertia === inertia2
        ? []
        : ['inertia: only in one']),
    ...record('balance', { ...first.balance }, { ...second.balance }, (path, a, b) =>
      figure(path, a, b, /\.(x|neutralPoint)$/.test(path) ? MILLIMETRES : 0),
    ),
    ...record('loading', { ...first.loading }, { ...second.loading }, plain),
    ...record('speeds', { ...first.speeds }, { ...second.speeds }, plain),
  ];
}

function planformDifferences(first: Estimate['planform'], second: Estimate['planform']): string[] {
  return [...new Set([...Object.keys(first), ...Object.keys(second)])].flatMap((key) => {
    const [a, b] = [first[key], second[key]];
    if (!a || !b) return [`planform.${key}: only in one`];
    return record(`planform.${key}`, { ...a }, { ...b }, (path, x, y) =>
      figure(path, x, y, /xLeMac|yMac/.test(path) ? MILLIMETRES : 0),
    );
  });
}

function record(
  path: string,
  first: Record<string, Figure>,
  second: Record<string, Figure>,
  compare: (path: string, a: Figure, b: Figure) => string[],
): string[] {
  return [...new Set([...Object.keys(first), ...Object.keys(second)])].flatMap((key) => {
    const [a, b] = [first[key], second[key]];
    if (a === undefined || b === undefined) return [`${path}.${key}: only in one`];
    return compare(`${path}.${key}`, a, b);
  });
}

const AXES = ['x', 'y', 'z'] as const;
const place = (path: string, first: Vec3, second: Vec3) =>
  AXES.flatMap((axis, i) => figure(`${path} ${axis}`, first[i] ?? null, second[i] ?? null, MILLIMETRES));

function figure(path: string, first: Figure, second: Figure, slack = 0): string[] {
  if (first === null || second === null) return first === second ? [] : [`${path}: ${first} and ${second}`];
  const allowed = Math.max(SHARE * Math.max(Math.abs(first), Math.abs(second)), slack, NOTHING);
  const apart = Math.abs(first - second);
  return apart <= allowed ? [] : [`${path}: ${first} and ${second}`];
}
