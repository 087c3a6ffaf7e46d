import type { Surface } from '../plan.ts';

/** A half of a mirrored surface. */
export type Half = 'port' | 'starboard';

/**
 * One half of a mirrored surface alone, drawn as a starboard half: what is built on the other half is left out, and
 * what is named for this one stands.
 * @example mirrorSide(EXAMPLE_WING, 'port').mirrored // → false
 */
export function mirrorSide(surface: Surface, half: Half): Surface {
  const parts = surface.parts
    .filter(({ side = 'both' }) => side === 'both' || side === half)
    .map((part) => ({ ...part, side: undefined }));
  return { ...surface, mirrored: false, parts };
}
