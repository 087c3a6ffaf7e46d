import type { FieldFigures } from '#shared/core/field/field-account.ts';
import type { WingReference } from '#shared/core/wing-reference.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { percentAt, type WantedRange } from './wanted-range.ts';

export interface FieldVerdict {
  kind: 'inside' | 'close' | 'outside' | 'none';
  headline: string;
  detail: string;
}

const percent = (value: number) => `${formatNumber(value, 1)}${NARROW_SPACE}%`;

/** How the model balances against the range asked for, in words to be read at arm’s length. */
export function fieldVerdict(
  { x, ux, percentMac }: FieldFigures,
  range: WantedRange | null,
  wing: WingReference | null,
  units: Units,
): FieldVerdict {
  const mm = (value: number) => units.format(value, 'length');
  const place = `${units.format(x, 'length', { bare: true })} ± ${units.doubt(ux, 'length')} aft of the datum`;
  const chord = percentMac === null ? '' : `, ${percent(percentMac)} MAC`;
  if (!range) {
    return {
      kind: 'none',
      headline: `Balances at ${mm(x)}`,
      detail: `${place}${chord}. Say where it is to balance.`,
    };
  }
  const [from, to] = [percentAt(range.from, wing), percentAt(range.to, wing)];
  const ends =
    from === null || to === null
      ? `${units.format(range.from, 'length', { bare: true })}–${mm(range.to)}`
      : `${formatNumber(from, 1)}–${percent(to)}, ${units.format(range.from, 'length', { bare: true })}–${mm(range.to)}`;
  const detail = `${place}${chord}. Range ${ends}.`;
  const over = x > range.to ? x - range.to : x < range.from ? range.from - x : 0;
  const side = x > range.aim ? 'aft' : 'forward';
  if (over > 0) {
    const words = x > range.to ? 'aft of your range' : 'ahead of your range';
    return { kind: 'outside', headline: `${mm(over)} ${words}`, detail };
  }
  if (Math.min(x - range.from, range.to - x) < ux) {
    return {
      kind: 'close',
      headline: `Inside, but near the ${side} end`,
      detail: `${detail} The end lies within what scales and tape can tell.`,
    };
  }
  const off = Math.abs(x - range.aim);
  const headline = off <= ux ? 'On the middle of your range' : `Inside, ${mm(off)} ${side} of the middle`;
  return { kind: 'inside', headline, detail };
}
