import type { Half } from './half.ts';
import { placeAt, type Place } from './place.ts';

export interface Slice {
  s: number;
  from: number;
  to: number;
  ds: number;
  place: Place;
}

/** Along a half there are so many slices from the root to the tip, or a few more. */
const SLICES = 1000;
const TIP_SLICES = 150;

/** Thin slices from one station to another, none of them across a panel's joint or the end of a part. */
export function slicesOf(half: Half, range: { from: number; to: number }): Slice[] {
  const ends = new Set<number>([range.from, range.to]);
  let joint = 0;
  for (const panel of half.surface.panels) ends.add((joint += panel.span));
  for (const part of half.parts) {
    if ('from' in part && part.from !== undefined) ends.add(part.from);
    if ('to' in part && part.to !== undefined) ends.add(part.to);
  }
  const cuts = [...ends].filter((s) => range.from <= s && s <= range.to).sort((a, b) => a - b);
  return cuts.slice(1).flatMap((end, i) => {
    const start = cuts[i] ?? 0;
    const count = Math.ceil(((end - start) / half.tip) * SLICES);
    const ds = (end - start) / count;
    return Array.from({ length: count }, (_, k): Slice => {
      const s = start + (k + 0.5) * ds;
      return { s, from: s - ds / 2, to: s + ds / 2, ds, place: placeAt(half.surface, s) };
    });
  });
}

/** Slices of a tip block: how far beyond the last station, how thick, and the scale of the section there. */
export function tipSlices(length: number): { beyond: number; ds: number; scale: number }[] {
  return Array.from({ length: TIP_SLICES }, (_, k) => {
    // Thinner and thinner towards the tip, where the outline turns in.
    const edge = (j: number) => length * Math.sin((Math.PI / 2) * (j / TIP_SLICES));
    const beyond = (edge(k) + edge(k + 1)) / 2;
    return { beyond, ds: edge(k + 1) - edge(k), scale: Math.sqrt(1 - (beyond / length) ** 2) };
  });
}
