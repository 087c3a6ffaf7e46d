import type { Units } from '#shared/format/units.ts';
import { overMinimum, type AirRow } from './airs.ts';

/** What the air changes from the workshop to the field, and between a dry and a damp day. */
export function weatherHeadline(
  rows: readonly AirRow[],
  minimum: number | null,
  units: Units,
): { title: string; text: string } {
  const of = (key: AirRow['key']) => rows.find((row) => row.key === key);
  const [workshop, field, dry, damp] = [of('workshop'), of('field'), of('dry'), of('damp')];
  if (!workshop || !field || !dry || !damp) return { title: '', text: '' };
  const mass = (value: number) => units.format(value, 'mass');
  const change = field.mass - workshop.mass;
  const title =
    mass(Math.abs(change)) === mass(0)
      ? 'The field’s air leaves the mass as it is in the workshop'
      : `${mass(Math.abs(change))} ${change > 0 ? 'heavier' : 'lighter'} at the field than in the workshop`;
  const shift =
    workshop.percentMac === null || field.percentMac === null
      ? ''
      : `It balances at ${units.format(field.percentMac, 'percentMac')} MAC instead of ${units.format(workshop.percentMac, 'percentMac')}. `;
  const range = `A dry day makes it ${mass(dry.mass)}, a damp one ${mass(damp.mass)}`;
  return { title, text: `${shift}${range}${verdict(dry.mass, minimum, mass)}.` };
}

function verdict(dryMass: number, minimum: number | null, mass: (value: number) => string): string {
  if (minimum === null) return '';
  const { over, short } = overMinimum(dryMass, minimum);
  return short
    ? `; on the dry one it is ${mass(-over)} short of the class minimum`
    : `; even on the dry one it is ${mass(over)} over the class minimum`;
}
