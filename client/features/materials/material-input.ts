import type { MaterialDto, MaterialInput } from '#shared/schemas/material.ts';
import type { Quantity } from '#shared/units/quantities.ts';

type NumberName = 'density' | 'areal' | 'spread' | 'cv' | 'modulus' | 'strength' | 'moisture';

interface NumberFieldSpec {
  id: NumberName;
  label: string;
  quantity: Quantity;
  required: boolean;
  hint?: string;
}

export const NUMBER_FIELDS: readonly NumberFieldSpec[] = [
  { id: 'density', label: 'Density', quantity: 'density', required: false },
  {
    id: 'areal',
    label: 'Mass by area',
    quantity: 'areal',
    required: false,
    hint: 'For covering, finish and thin ply.',
  },
  {
    id: 'spread',
    label: 'Dry mass by area of joint',
    quantity: 'spread',
    required: false,
    hint: 'For glue.',
  },
  {
    id: 'cv',
    label: 'Spread of that figure, ±',
    quantity: 'fineShare',
    required: true,
    hint: 'One standard deviation, as a share of it.',
  },
  { id: 'modulus', label: 'Bending stiffness', quantity: 'modulus', required: false },
  { id: 'strength', label: 'Bending strength', quantity: 'strength', required: false },
  { id: 'moisture', label: 'Moisture at which it holds', quantity: 'fineShare', required: false },
];

export const FORM_FIELDS = [
  'name',
  'category',
  'density',
  'areal',
  'spread',
  'cv',
  'modulus',
  'strength',
  'moisture',
  'form',
  'source',
  'basis',
  'shared',
] as const satisfies readonly (keyof MaterialInput)[];

/** What the form begins with: a row as it is, or a new one, perhaps with the figures of another. */
export function inputOf(row: MaterialDto | null, same: boolean): MaterialInput {
  if (row === null) return BLANK;
  const { id: _id, key: _key, version: _version, usedBy: _usedBy, can: _can, ...fields } = row;
  return same
    ? fields
    : { ...fields, name: `${row.name}, mine`, basis: 'own measurement', source: '', shared: false };
}

const BLANK: MaterialInput = {
  name: '',
  category: 'wood',
  density: null,
  areal: null,
  spread: null,
  cv: 0.08,
  modulus: null,
  strength: null,
  moisture: null,
  form: '',
  source: '',
  basis: 'own measurement',
  shared: false,
};
