import type { Line } from '#shared/core/result.ts';

/** A group of parts as one mass on the beam. */
export interface HungMass {
  key: string;
  label: string;
  mass: number;
  /** mm aft of the datum */
  arm: number;
  /** id of the heaviest line, which gives the hatch */
  heaviest: Line;
}

/** Surfaces by their key, everything else by its group; heaviest first. */
export function hungMasses(lines: readonly Line[]): HungMass[] {
  const groups = new Map<string, Line[]>();
  for (const line of lines) {
    const key = line.surface ?? line.group;
    groups.set(key, [...(groups.get(key) ?? []), line]);
  }
  return [...groups]
    .flatMap(([key, members]): HungMass[] => {
      const mass = members.reduce((sum, line) => sum + line.mass, 0);
      const [heaviest] = [...members].sort((a, b) => b.mass - a.mass);
      if (!(mass > 0) || heaviest === undefined) return [];
      const arm = members.reduce((sum, line) => sum + line.moment, 0) / mass;
      return [{ key, label: key.charAt(0).toUpperCase() + key.slice(1), mass, arm, heaviest }];
    })
    .sort((a, b) => b.mass - a.mass);
}

/** A circle on its thread: where it hangs and how far down. */
export interface Hung extends HungMass {
  x: number;
  radius: number;
  drop: number;
}

interface Layout {
  toX: (arm: number) => number;
  /** of the heaviest mass, drawing units */
  largest: number;
  /** of the shortest thread */
  shortest: number;
  /** kept free round a circle, for its label */
  room: { side: number; below: number };
}

/** Areas in proportion to the masses; each hangs as high as it can without touching another or its label. */
export function hang(masses: readonly HungMass[], { toX, largest, shortest, room }: Layout): Hung[] {
  const heaviest = masses[0]?.mass ?? 1;
  const placed: Hung[] = [];
  for (const mass of masses) {
    const radius = Math.max(3, largest * Math.sqrt(mass.mass / heaviest));
    const hung = { ...mass, x: toX(mass.arm), radius, drop: shortest + radius };
    for (let tries = 0; tries < 60 && placed.some((other) => touches(hung, other, room)); tries++)
      hung.drop += 6;
    placed.push(hung);
  }
  return placed;
}

function touches(a: Hung, b: Hung, room: Layout['room']): boolean {
  const across = Math.abs(a.x - b.x) < Math.max(a.radius, room.side) + Math.max(b.radius, room.side);
  const [upper, lower] = a.drop < b.drop ? [a, b] : [b, a];
  return across && lower.drop - lower.radius < upper.drop + upper.radius + room.below;
}
