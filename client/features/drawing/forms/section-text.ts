import type { PointsSpec, SectionSpec } from '#shared/core/plan.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
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
