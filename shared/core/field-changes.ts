import { isAlike, isBranch } from './alike.ts';

/** A value as it can be told in one line. */
export type ChangeValue = number | string | boolean | number[] | null;

/** One difference between two plans, as data; the client words it. */
export interface PlanChange {
  /** place in the plan by keys, such as `surfaces/wing/parts/spar`, `items/nose`, `surfaces/wing/panels/2`, `target` */
  path: string;
  /** name of the part, item, material …, as in the later plan */
  name: string;
  /**
   * the field; null where the whole thing was added (`from` is null) or removed (`to` is null), the other value
   * then being its kind; `order` where things of a list changed places
   */
  field: string | null;
  /** null where the field was not there; a section or an outline by its name or number of points */
  from: ChangeValue;
  to: ChangeValue;
  /** unit of both values, a base unit of `frame.ts`; null for text, counts and whole things */
  unit: ChangeUnit | null;
}

/** Unit of a changed value, by its key in `shared/units`. */
export type ChangeUnit = 'mm' | 'g' | 'deg' | 'kg/m3' | 'g/m2' | 'GPa' | 'MPa' | 'one' | 'percent';

const FIELDS: Record<ChangeUnit, string> = {
  mm: 'span rootChord tipChord sweep apex thickness length width height wall from to stations at y',
  g: 'mass u',
  deg: 'dihedral',
  'kg/m3': 'density airDensity',
  'g/m2': 'areal spread',
  GPa: 'modulus',
  MPa: 'strength',
  one: 'lightening hollow cutout share overlap start end cv moistureAtDensity clMax loadFactor',
  percent: 'percentMac tolerance',
};

const UNIT_OF = new Map(
  (Object.keys(FIELDS) as ChangeUnit[]).flatMap((unit) =>
    FIELDS[unit].split(' ').map((field) => [field, unit] as const),
  ),
);

/** A place along the chord is a pair of shares; a place in space has three coordinates. */
const unitOf = (field: string, value: ChangeValue): ChangeUnit | null =>
  field === 'at' && Array.isArray(value) && value.length === 2 ? 'one' : (UNIT_OF.get(field) ?? null);

/**
 * The differing fields of two things that are one and the same at two times; what is undefined is not there.
 * `where` is the thing's place and name, as every change carries them. Empty for things that say the same
 * (`isAlike`).
 * @example fieldChanges({ path: 'items/nose', name: 'Nose' }, { mass: 8 }, { mass: 10 }) // → [{ path: 'items/nose', name: 'Nose', field: 'mass', from: 8, to: 10, unit: 'g' }]
 */
export function fieldChanges(
  where: { path: string; name: string },
  before: object,
  after: object,
): PlanChange[] {
  const [was, is] = [new Map(Object.entries(before)), new Map(Object.entries(after))];
  return [...new Set([...was.keys(), ...is.keys()])].flatMap((field): PlanChange[] => {
    const [one, other] = [was.get(field), is.get(field)];
    if (isAlike(one, other)) return [];
    const [from, to] = [valueOf(one), valueOf(other)];
    const unit =
      typeof (to ?? from) === 'string' ? null : (sectionUnit(one, other) ?? unitOf(field, to ?? from));
    return [{ ...where, field, from, to, unit }];
  });
}

/** Plates are told by their thickness. */
const sectionUnit = (one: unknown, other: unknown) => (isPlate(one) && isPlate(other) ? 'mm' : undefined);

const isPlate = (value: unknown): value is { flat: number } =>
  isBranch(value) && Object.hasOwn(value, 'flat');

function valueOf(value: unknown): ChangeValue {
  switch (typeof value) {
    case 'number':
    case 'string':
    case 'boolean':
      return value;
    default:
      return isBranch(value) ? branchValue(value) : null;
  }
}

function branchValue(value: Record<string, unknown>): ChangeValue {
  if (isNumbers(value)) return value;
  if (Array.isArray(value)) return `${value.length} points`;
  if (isPlate(value)) return value.flat;
  return Object.hasOwn(value, 'naca') ? `NACA ${String(value['naca'])}` : String(value['name']);
}

const isNumbers = (value: unknown): value is number[] =>
  Array.isArray(value) && value.every((entry) => typeof entry === 'number');
