import { stripZ } from '#shared/core/fit.ts';
import { stripAt, type Half, type StripAt } from '#shared/core/half.ts';
import type { Strip } from '#shared/core/plan.ts';
import { ordinateAt } from '#shared/core/section-integrals.ts';
import type { Station } from '#shared/core/stations.ts';
import { ellipse, type Point } from './shape.ts';

/** A strip's cross-section at a station as the calculator counts it, before anything is sanded off. */
export interface StripSection {
  place: StripAt;
  /** middle of its height above the chord line, mm */
  z: number;
  points: Point[];
  hole?: Point[];
}

export function stripSection(half: Half, strip: Strip, station: Station): StripSection {
  const place = stripAt(strip, station);
  const z = stripZ(half, strip, station, place);
  const middle: Point = [place.centre, z];
  const [w, h] = [place.width / 2, place.height / 2];
  switch (strip.profile) {
    case 'rectangle':
      return { place, z, points: rectangle(place.front, place.back, z - h, z + h) };
    case 'triangle':
      return {
        place,
        z,
        points: [
          [place.front, z + h],
          [place.back, z],
          [place.front, z - h],
        ],
      };
    case 'round':
      return { place, z, points: ellipse(middle, w, h) };
    case 'tube': {
      const wall = strip.wall ?? 0;
      const hole = ellipse(middle, Math.max(0, w - wall), Math.max(0, h - wall));
      return { place, z, points: ellipse(middle, w, h), hole };
    }
  }
}

export function rectangle(left: number, right: number, bottom: number, top: number): Point[] {
  return [
    [left, top],
    [right, top],
    [right, bottom],
    [left, bottom],
  ];
}

const SANDING_STEPS = 24;

/**
 * A nose or tail strip sanded down to the section: what its stock and the section have in common. Empty where they
 * have nothing.
 */
export function sanded(strip: Strip, { place, z }: StripSection, station: Station): Point[] {
  const upper: Point[] = [];
  const lower: Point[] = [];
  const { chord, section } = station;
  if (chord <= 0 || place.width <= 0) return [];
  for (let i = 0; i <= SANDING_STEPS; i++) {
    const x = place.front + (place.width * i) / SANDING_STEPS;
    const half = halfHeightAt(strip, place, (i / SANDING_STEPS) * 2 - 1);
    const top = Math.min(z + half, ordinateAt(section, 'upper', x / chord) * chord);
    const bottom = Math.max(z - half, ordinateAt(section, 'lower', x / chord) * chord);
    if (top < bottom) continue;
    upper.push([x, top]);
    lower.push([x, bottom]);
  }
  return [...upper, ...lower.reverse()];
}

/** Half the height of the stock at a place across its width, −1 in front, 1 at the back. */
function halfHeightAt(strip: Strip, place: StripAt, across: number): number {
  const full = place.height / 2;
  if (strip.profile === 'triangle') return (full * (1 - across)) / 2;
  if (strip.profile === 'rectangle') return full;
  return full * Math.sqrt(Math.max(0, 1 - across * across));
}
