import type { BuiltSide, SidedLine } from './sided-lines.ts';

/** One thing that a weighing had on the scale. */
export interface Covered {
  line: string;
  side: BuiltSide;
}

/** A set of parts on the scale together, tare off; later ones count before earlier ones. */
export interface Weighing {
  id: string;
  covers: readonly Covered[];
  /** g */
  mass: number;
  /** standard uncertainty, g */
  u: number;
  /** where the set balanced, mm aft of the datum, where that was measured */
  x?: number | undefined;
}

/**
 * Name of a line on its side, to look it up by.
 * @example keyOf({ line: 'wing/ribs', side: 'port' }) // → 'wing/ribs port'
 */
export function keyOf({ line, side }: Covered): string {
  return `${line} ${side}`;
}

/**
 * The lines that a weighing covers and that the plan still has, by their place, each once.
 * @example placesOf([{ line: 'a', side: 'port' }], { covers: [{ line: 'a', side: 'port' }, { line: 'gone', side: 'port' }] }) // → { places: [0], strays: [{ line: 'gone', side: 'port' }] }
 */
export function placesOf(
  lines: readonly Pick<SidedLine, 'line' | 'side'>[],
  { covers }: Pick<Weighing, 'covers'>,
): { places: number[]; strays: Covered[] } {
  const byKey = new Map(lines.map((line, i) => [keyOf(line), i]));
  const places = new Set(covers.flatMap((one) => byKey.get(keyOf(one)) ?? []));
  return {
    places: [...places].sort((a, b) => a - b),
    strays: covers.filter((one) => !byKey.has(keyOf(one))),
  };
}
