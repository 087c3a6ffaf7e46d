import type { MaterialCategory } from '#shared/core/plan.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import { categoryWord } from './words.ts';

export type CategoryChoice = MaterialCategory | 'all' | 'own';

/** Rows of the chosen category in which every word sought stands somewhere. */
export function filterMaterials(
  materials: readonly MaterialDto[],
  search: string,
  choice: CategoryChoice,
): MaterialDto[] {
  const words = plain(search).split(/\s+/).filter(Boolean);
  return materials.filter((row) => {
    if (!isOf(row, choice)) return false;
    const text = plain([row.name, categoryWord(row.category), row.form, row.source, row.basis].join(' '));
    return words.every((word) => text.includes(word));
  });
}

/** How many rows each choice holds. */
export function countMaterials(materials: readonly MaterialDto[], choice: CategoryChoice): number {
  return materials.filter((row) => isOf(row, choice)).length;
}

function isOf(row: MaterialDto, choice: CategoryChoice): boolean {
  if (choice === 'all') return true;
  return choice === 'own' ? !row.shared : row.category === choice;
}

function plain(text: string): string {
  return text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase();
}
