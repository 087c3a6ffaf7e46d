import { facesOf } from './faces.ts';
import { covers, type Half, type StripAt } from './half.ts';
import type { Strip } from './plan.ts';
import { arcBetween, heightAt, ordinateAt, wrapArc, type Sums } from './section-integrals.ts';
import type { Station } from './stations.ts';

/** Two edges closer than this, x/c, meet. */
const TOUCH = 1e-9;

/**
 * Developed length that a skin, cap strip or covering takes at a station, mm, with its first moments about the
 * leading edge and the chord line, mm². Only what lies inside `extent`, x/c, counts.
 * @example developedAt(EXAMPLE_SKIN, EXAMPLE_STATION) // → { amount: 50, x: 1250, z: 250 }
 */
export function developedAt(
  part: Parameters<typeof facesOf>[0],
  station: Station,
  extent: [number, number] = [0, 1],
): Sums {
  const { section, chord } = station;
  const [low, high] = extent;
  const faces = facesOf(part);
  const [one, other] = faces;
  const sum: Sums = { amount: 0, x: 0, z: 0 };
  if (one && other && one.from <= 0 && other.from <= 0 && low <= 0) {
    addArc(sum, wrapArc(section, Math.min(one.to, high), Math.min(other.to, high)), chord);
    return sum;
  }
  for (const { face, from, to } of faces) {
    const a = Math.max(from, low);
    const b = Math.min(to, high);
    if (b > a) addArc(sum, arcBetween(section, face, a, b), chord);
  }
  return sum;
}

function addArc(sum: Sums, arc: Sums, chord: number): void {
  sum.amount += arc.amount * chord;
  sum.x += arc.x * chord * chord;
  sum.z += arc.z * chord * chord;
}

/**
 * Thickness of the skins that lie over x/c on a face at a station, mm. A skin that ends there covers it; where one
 * ends and another begins (a butt joint over a spar) the thicker side counts, not both.
 * @example skinOver(EXAMPLE_HALF, EXAMPLE_STATION, 'upper', 0.25) // → 1
 */
export function skinOver(half: Half, station: Station, face: 'upper' | 'lower', x: number): number {
  let [over, ending, starting] = [0, 0, 0];
  for (const { skin, from, to } of half.over[face]) {
    if (x < from - TOUCH || x > to + TOUCH || !covers(skin, station.s)) continue;
    if (x > to - TOUCH) ending += skin.thickness;
    else if (x < from + TOUCH) starting += skin.thickness;
    else over += skin.thickness;
  }
  return over + Math.max(ending, starting);
}

/**
 * Height of the section at x/c, mm, and of what is left of it under the skins there (negative where these are
 * thicker than the section).
 * @example heightsAt(EXAMPLE_HALF, EXAMPLE_STATION, 0.25) // → { section: 10, underSkins: 9 }
 */
export function heightsAt(half: Half, station: Station, x: number): { section: number; underSkins: number } {
  const section = heightAt(station.section, x) * station.chord;
  const skins = skinOver(half, station, 'upper', x) + skinOver(half, station, 'lower', x);
  return { section, underSkins: section - skins };
}

/**
 * z of a strip's centre above the chord line, mm: outer face flush with the section, or with a skin's underside.
 * Strips of other seats than `top` and `bottom` lie halfway between the faces.
 * @example stripZ(EXAMPLE_HALF, EXAMPLE_SPAR, EXAMPLE_STATION, stripAt(EXAMPLE_SPAR, EXAMPLE_STATION)) // → 3
 */
export function stripZ(half: Half, strip: Strip, station: Station, place: StripAt): number {
  const { section, chord } = station;
  const x = chord > 0 ? place.centre / chord : 0;
  const upper = ordinateAt(section, 'upper', x) * chord;
  const lower = ordinateAt(section, 'lower', x) * chord;
  if (strip.seat === 'top') return upper - skinOver(half, station, 'upper', x) - place.height / 2;
  if (strip.seat === 'bottom') return lower + skinOver(half, station, 'lower', x) + place.height / 2;
  return (upper + lower) / 2;
}
