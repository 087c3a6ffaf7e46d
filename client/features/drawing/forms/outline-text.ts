import { NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { Parsed } from './parsed-field.tsx';

type Corner = [x: number, z: number];

/** Corners of a plate as text: `-150 -10; 100 -20; 100 20`. */
export function outlineText(outline: readonly Corner[], units: Units): string {
  // A space parts x from z, so it must not part a fraction or thousands.
  const one = (value: number) =>
    units.size(value, { bare: true, decimal: true, exact: true }).replaceAll(NARROW_SPACE, '');
  return outline.map(([x, z]) => `${one(x)} ${one(z)}`).join('; ');
}

/** Reads corners of two numbers each, parted by semicolons or line breaks. */
export function parseOutline(text: string, units: Units): Parsed<Corner[]> {
  const corners: Corner[] = [];
  for (const piece of text.split(/[;\n]/)) {
    const words = piece
      .trim()
      .split(/\s+/)
      .filter((word) => word !== '');
    if (words.length === 0) continue;
    const [x, z] = words.map((word) => parseQuantity(word, 'length', units.unit('length')));
    if (words.length !== 2 || !x || !z || !('value' in x) || !('value' in z)) {
      return { problem: `“${piece.trim().slice(0, 24)}” is not a corner. Write x z; x z; x z.` };
    }
    corners.push([x.value, z.value]);
  }
  const { min } = LIMITS.outlinePoints;
  return corners.length < min ? { problem: `Give at least ${min} corners.` } : { value: corners };
}
