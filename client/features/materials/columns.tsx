import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  tableFeatures,
} from '@tanstack/react-table';
import { NO_VALUE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import { categoryWord } from './words.ts';

export const features = tableFeatures({ rowSortingFeature, sortedRowModel: createSortedRowModel() });
const helper = createColumnHelper<typeof features, MaterialDto>();

/** A figure's column: what is not known sorts last, whichever way. */
export interface FigureColumn {
  id: 'density' | 'areal' | 'spread' | 'cv' | 'modulus' | 'strength' | 'moisture';
  label: string;
  quantity: Quantity;
}
export const FIGURES: readonly FigureColumn[] = [
  { id: 'density', label: 'Density', quantity: 'density' },
  { id: 'areal', label: 'By area', quantity: 'areal' },
  { id: 'spread', label: 'Joint', quantity: 'spread' },
  { id: 'cv', label: 'Spread ±', quantity: 'fineShare' },
  { id: 'modulus', label: 'Stiffness', quantity: 'modulus' },
  { id: 'strength', label: 'Strength', quantity: 'strength' },
  { id: 'moisture', label: 'Moisture', quantity: 'fineShare' },
];

/** Text of one figure without its unit, which stands in the heading. */
export function figureText(row: MaterialDto, { id, quantity }: FigureColumn, units: Units): string {
  const value = row[id];
  return value === null ? NO_VALUE : units.format(value, quantity, { bare: true });
}

const byText = (left: string, right: string) => left.localeCompare(right, 'en', { numeric: true });

export const columns = helper.columns([
  helper.accessor('name', { sortFn: (a, b) => byText(a.original.name, b.original.name) }),
  helper.accessor('category', {
    sortFn: (a, b) =>
      byText(categoryWord(a.original.category), categoryWord(b.original.category)) ||
      byText(a.original.name, b.original.name),
  }),
  ...FIGURES.map(({ id }) =>
    helper.accessor((row) => row[id] ?? undefined, {
      id,
      sortUndefined: 'last',
      sortDescFirst: false,
      sortFn: (a, b) => (a.original[id] ?? 0) - (b.original[id] ?? 0),
    }),
  ),
  helper.accessor('basis', { sortFn: (a, b) => byText(a.original.basis, b.original.basis) }),
  helper.accessor('usedBy', { sortFn: (a, b) => a.original.usedBy - b.original.usedBy }),
]);
