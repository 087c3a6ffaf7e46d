import type { ChangeValue } from '#shared/core/field-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import { NO_VALUE, type QuantityOptions } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';

interface Values {
  field: string | null;
  from: ChangeValue;
  to: ChangeValue;
  unit: string | null;
}

/** Both values of a change, `1.6 → 2.4 mm`, or the one that there is. */
export function valuesInWords(change: Values, materials: Plan['materials'], units: Units): string {
  const { from, to, unit } = change;
  if (Array.isArray(from) && Array.isArray(to)) {
    const apart = entriesInWords(change, from, to, units);
    if (apart !== null) return apart;
  }
  const stations = change.field === 'stations';
  const text = (value: ChangeValue, bare: boolean, fine: boolean) =>
    stations && Array.isArray(value)
      ? String(value.length)
      : valueText(value, change, { materials, units, bare, fine });
  const both = (fine: boolean): [string, string] => [
    text(from, unit !== null && to !== null, fine),
    text(to, false, fine),
  ];
  const [was, is] = both(false);
  if (from === null) return is;
  if (to === null) return `${was} ${ARROW} none`;
  if (was !== text(to, unit !== null, false)) return `${was} ${ARROW} ${is}`;
  const [first, second] = both(true);
  // Two outlines of as many points, say: what differs is too much for a line.
  return first === text(to, unit !== null, true) ? 'changed' : `${first} ${ARROW} ${second}`;
}

/** One value of a change by itself, with its unit. */
export function valueInWords(
  value: ChangeValue,
  change: Pick<Values, 'field' | 'unit'>,
  materials: Plan['materials'],
  units: Units,
): string {
  if (change.field === 'stations' && Array.isArray(value)) return String(value.length);
  return valueText(value, change, { materials, units, bare: false, fine: false });
}

const ARROW = '→';
const AXES = ['x', 'y', 'z'];

/** Where only some entries of a list differ: a coordinate, a station. */
function entriesInWords(
  { field, unit }: Values,
  from: readonly number[],
  to: readonly number[],
  units: Units,
): string | null {
  if (from.length !== to.length || from.length < 3) return null;
  const differing = from.flatMap((value, i) => (value === to[i] ? [] : [i]));
  const named = field === 'stations' ? 1 : AXES.length;
  if (differing.length > named) return null;
  return differing
    .map((i) => {
      const name = field === 'stations' ? `station ${i + 1},` : (AXES[i] ?? '');
      const values = { field: null, from: from[i] ?? null, to: to[i] ?? null, unit };
      return `${name} ${valuesInWords(values, {}, units)}`;
    })
    .join(', ');
}

interface Manner {
  materials: Plan['materials'];
  units: Units;
  /** without the unit, which the value behind it names */
  bare: boolean;
  /** with one more digit, where fewer would not tell two values apart */
  fine: boolean;
}

function valueText(value: ChangeValue, { field, unit }: Pick<Values, 'field' | 'unit'>, manner: Manner) {
  if (value === null) return NO_VALUE;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') {
    return field === 'material' ? (manner.materials[value]?.name ?? value.replaceAll('-', ' ')) : value;
  }
  if (typeof value === 'number') return numberText(value, field, unit, manner);
  const numbers = value.every((entry) => entry === value[0]) ? value.slice(0, 1) : value;
  const texts = numbers.map((entry, i) =>
    numberText(entry, field, unit, { ...manner, bare: manner.bare || i < numbers.length - 1 }),
  );
  return texts.join(value.length === 2 ? '–' : ', ');
}

const QUANTITY_OF: Record<string, Quantity> = {
  g: 'mass',
  deg: 'angle',
  'kg/m3': 'density',
  'g/m2': 'areal',
  GPa: 'modulus',
  MPa: 'strength',
  one: 'share',
  percent: 'percentMac',
};
const OWN_QUANTITY: Record<string, Quantity> = {
  airDensity: 'airDensity',
  spread: 'spread',
  clMax: 'ratio',
  loadFactor: 'ratio',
};

function numberText(
  value: number,
  field: string | null,
  unit: string | null,
  { units, bare, fine }: Manner,
): string {
  if (unit === null) return String(value);
  if (unit === 'mm') return units.size(value, { bare });
  const quantity = OWN_QUANTITY[field ?? ''] ?? QUANTITY_OF[unit];
  if (quantity === undefined) return `${value}${bare ? '' : ` ${unit}`}`;
  const options: QuantityOptions = { bare, fine };
  return `${units.format(value, quantity, options)}${unit === 'percent' && !bare && field === 'percentMac' ? ' MAC' : ''}`;
}
