import { nacaOrdinate } from '#shared/core/naca.ts';

type Pair = [number, number];

/** Coordinates as files have them, to five digits. */
const rounded = (value: number) => Math.round(value * 1e5) / 1e5;
const STATIONS = [
  0, 0.0125, 0.025, 0.05, 0.075, 0.1, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95, 1,
];

const face = (side: 1 | -1) =>
  STATIONS.map((x): Pair => [x, x === 0 ? 0 : rounded(nacaOrdinate('4409', x, side))]);

/** A four-digit section round from the trailing edge over the top. */
export const ROUND: Pair[] = [...face(1).reverse(), ...face(-1).slice(1)];

/** Both faces from nose to tail. */
export function facesOf(round: readonly Pair[]): { upper: Pair[]; lower: Pair[] } {
  const nose = round.findIndex(([x]) => x === 0);
  return { upper: round.slice(0, nose + 1).reverse(), lower: round.slice(nose) };
}

export const textOf = (points: readonly Pair[], between = '  ') =>
  points.map(([x, z]) => `${x.toFixed(5)}${between}${z.toFixed(5)}`).join('\n');
