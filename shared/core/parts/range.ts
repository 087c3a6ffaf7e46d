import type { Half } from '../half.ts';

/**
 * A part's range, mm, in order and clipped to the surface's outer end; what had to be mended is told
 * (`reversed_range`, `station_past_tip`).
 * @example clippedRange(EXAMPLE_HALF, { id: 'spar', from: 600, to: 400 }) // → [400, 500]
 */
export function clippedRange(
  half: Half,
  part: { id: string; from: number; to: number },
): [from: number, to: number] {
  const path = `${half.surface.key}/${part.id}`;
  if (part.from > part.to) half.notice({ code: 'reversed_range', path, from: part.from, to: part.to });
  const tip = half.line.length;
  if (Math.max(part.from, part.to) > tip + 1e-6) {
    half.notice({ code: 'station_past_tip', path, station: Math.max(part.from, part.to), tip });
  }
  const from = Math.min(part.from, part.to, tip);
  return [from, Math.min(Math.max(part.from, part.to), tip)];
}
