import type { Beam } from '#shared/core/beam.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** The beam for those who do not see it. */
export function beamSentence(
  { masses, wanted, balance, leftOver, neutralPoint }: Beam,
  units: Units,
): string {
  const mm = (value: number) => units.format(value, 'length');
  const hung = masses
    .map(({ name, mass, x }) => `${name} ${units.format(mass, 'mass')} at ${mm(x)}`)
    .join(', ');
  const sentences = [
    `Hung on the beam from nose to tail: ${hung}.`,
    `It balances at ${mm(balance.x)}${balance.percentMac === null ? '' : `, ${formatNumber(balance.percentMac, 1)} % of the mean aerodynamic chord`}.`,
  ];
  if (wanted) {
    const pull = units.format(Math.abs(leftOver), 'moment');
    const end = leftOver > 0 ? 'tail' : 'nose';
    const level = Math.round(Math.abs(leftOver)) === 0;
    sentences.push(
      `The wanted point is ${mm(wanted.x)}; about it the beam ${level ? 'is level' : `tips ${end} down by ${pull}`}.`,
    );
  }
  if (neutralPoint !== null) sentences.push(`The neutral point is at ${mm(neutralPoint)}.`);
  return sentences.join(' ');
}
