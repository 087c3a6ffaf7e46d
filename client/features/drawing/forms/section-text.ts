import type { PointsSpec, SectionSpec } from '#shared/core/plan.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { Parsed } from './parsed-field.tsx';

/** A section as it is written: `4409`, `plate 3 mm`, or the name of own points. */
export function sectionText(spec: SectionSpec, units: Units): string {
  if ('naca' in spec) return spec.naca;
  if ('flat' in spec) return `plate ${units.size(spec.flat, { exact: true })}`.replaceAll(NARROW_SPACE, ' ');
  return spec.name;
}

/** Reads a section; own points keep their points and are renamed by what is typed. */
export function parseSection(text: string, before: SectionSpec, units: Units): Parsed<SectionSpec> {
  const typed = text.trim();
  const digits = /^(?:naca\s*)?(\d{4})$/i.exec(typed)?.[1];
  if (digits !== undefined) {
    if (digits.endsWith('00')) return { problem: 'The last two digits are the thickness; 00 has none.' };
    return { value: { naca: digits } };
  }
  if ('points' in before && typed !== '' && !/^plate\b/i.test(typed))
    return { value: { ...before, name: typed } };
  // A bare number may be the beginning of four digits; a plate says so, has a unit, or was one before.
  const [, word, size = ''] = /^(plate|flat)?\s*(.*)$/i.exec(typed) ?? [];
  const isPlate = word !== undefined || 'flat' in before || /[a-z"″]/i.test(size);
  const read = parseQuantity(size, 'length', units.unit('length'));
  if (isPlate && 'value' in read && read.value > 0) return { value: { flat: read.value } };
  return { problem: 'Write four digits such as 4409, or a plate such as 3 mm.' };
}

/** Own points as text, one to a line: x and z as shares of the chord. */
export function pointsText({ points }: Pick<PointsSpec, 'points'>): string {
  return points
    .map(([x, z]) => `${formatNumber(x, 5)} ${formatNumber(z, 5)}`.replaceAll('\u2212', '-'))
    .join('\n');
}

/** Coordinates beyond this are taken to be in per cent of the chord. */
const LARGEST_SHARE = 2;

/**
 * Reads pasted coordinates: one point to a line, round from the trailing edge over the top, the nose and the
 * underside. A first line without numbers is its title and is passed over; figures up to 100 are per cent.
 */
export function parsePoints(text: string): Parsed<[number, number][]> {
  const lines = text
    .split(/\r?\n/)
    .map((line) => line.trim())
    .filter((line) => line !== '');
  const points: [number, number][] = [];
  for (const [i, line] of lines.entries()) {
    const [x, z, ...rest] = line
      .split(/[\s;]+/)
      .map((word) => Number(word.replace(',', '.').replace('\u2212', '-')));
    const isPoint =
      x !== undefined && z !== undefined && rest.length === 0 && Number.isFinite(x) && Number.isFinite(z);
    if (isPoint) points.push([x, z]);
    else if (i > 0) return { problem: `Line ${i + 1}, “${line.slice(0, 24)}”, is not two numbers.` };
  }
  const { min, max } = LIMITS.sectionPoints;
  if (points.length < min) return { problem: `Paste at least ${min} points, one to a line.` };
  if (points.length > max) return { problem: `At most ${max} points can be kept.` };
  const isPercent = points.some(([x]) => Math.abs(x) > LARGEST_SHARE);
  const shares = isPercent ? points.map(([x, z]): [number, number] => [x / 100, z / 100]) : points;
  if (shares.some(([x, z]) => x < -0.5 || x > 1.5 || Math.abs(z) > 1)) {
    return { problem: 'A point lies far off the chord. Give x from 0 to 1 and z beside it.' };
  }
  if ((shares[0]?.[0] ?? 0) < 0.5 || (shares.at(-1)?.[0] ?? 0) < 0.5) {
    return {
      problem: 'Begin and end at the trailing edge: over the top to the nose, back along the underside.',
    };
  }
  return { value: shares };
}
