import type { Vec3 } from './frame.ts';

/**
 * An amount of stuff (mm³, mm² or g) with its moments about the datum: what every part is summed into. First
 * moments (∫x, ∫y, ∫z over the amount) give the centroid, second moments (∫x², ∫y², ∫z²) the inertia. Lengths mm.
 */
export interface Lump {
  amount: number;
  first: Vec3;
  second: Vec3;
}

/** A lump of nothing, to add to. @example emptyLump() // → { amount: 0, first: [0, 0, 0], second: [0, 0, 0] } */
export const emptyLump = (): Lump => ({ amount: 0, first: [0, 0, 0], second: [0, 0, 0] });

/**
 * Adds an amount at a point to a lump (the one given is changed: it is the caller's own sum). `spreadX` is the
 * mean square of the amount's own extent along x about that point, mm², where the amount is wide. An amount below 0
 * takes away.
 * @example (lump = emptyLump(), addAmount(lump, 2, [10, 0, 0]), lump) // → { amount: 2, first: [20, 0, 0], second: [200, 0, 0] }
 */
export function addAmount(lump: Lump, amount: number, at: Vec3, spreadX = 0): void {
  const { first, second } = lump;
  const [x, y, z] = at;
  lump.amount += amount;
  first[0] += amount * x;
  first[1] += amount * y;
  first[2] += amount * z;
  second[0] += amount * x * x;
  second[1] += amount * y * y;
  second[2] += amount * z * z;
  second[0] += amount * spreadX;
}

/**
 * Sum of lumps of one kind of amount; a lump of nothing for none. The lumps given are not changed.
 * @example sumLumps([{ amount: 2, first: [20, 0, 0], second: [200, 0, 0] }, emptyLump()]).first // → [20, 0, 0]
 */
export function sumLumps(lumps: readonly Lump[]): Lump {
  const sum = emptyLump();
  for (const { amount, first, second } of lumps) {
    sum.amount += amount;
    for (const axis of [0, 1, 2] as const) {
      sum.first[axis] += first[axis];
      sum.second[axis] += second[axis];
    }
  }
  return sum;
}

/**
 * The lump times a factor, as for a density or a share left standing.
 * @example scaleLump({ amount: 2, first: [20, 0, 0], second: [200, 0, 0] }, 3) // → { amount: 6, first: [60, 0, 0], second: [600, 0, 0] }
 */
export function scaleLump(lump: Lump, factor: number): Lump {
  return {
    amount: lump.amount * factor,
    first: times(lump.first, factor),
    second: times(lump.second, factor),
  };
}

const times = (v: Vec3, factor: number): Vec3 => [v[0] * factor, v[1] * factor, v[2] * factor];

/**
 * The lump's other half, mirrored in the plane of symmetry (y changes its sign).
 * @example mirrorLump({ amount: 2, first: [20, 8, 0], second: [200, 32, 0] }).first // → [20, -8, 0]
 */
export function mirrorLump(lump: Lump): Lump {
  return { ...lump, first: [lump.first[0], -lump.first[1], lump.first[2]] };
}

/** An amount below this (g, mm², mm³) is nothing: a quotient by it would be noise. */
export const NOTHING = 1e-12;

/**
 * Centroid, mm, or null where there is nothing.
 * @example centroid({ amount: 2, first: [20, 0, 4], second: [200, 0, 8] }) // → [10, 0, 2]
 * @example centroid(emptyLump()) // → null
 */
export function centroid(lump: Lump): Vec3 | null {
  const { amount, first } = lump;
  return amount < NOTHING ? null : [first[0] / amount, first[1] / amount, first[2] / amount];
}
