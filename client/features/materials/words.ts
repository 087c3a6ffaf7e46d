import type { MaterialCategory } from '#shared/core/plan.ts';
import { materialBasis, materialCategory } from '#shared/schemas/material.ts';

const CATEGORY_WORDS: Record<MaterialCategory, string> = {
  wood: 'Wood',
  composite: 'Composite',
  metal: 'Metal',
  sheet: 'Ply and board',
  covering: 'Covering',
  finish: 'Finish',
  adhesive: 'Glue',
};

export function categoryWord(category: MaterialCategory): string {
  return CATEGORY_WORDS[category];
}

export const CATEGORY_OPTIONS = materialCategory.options.map((value) => ({
  value,
  label: CATEGORY_WORDS[value],
}));
export const BASIS_OPTIONS = materialBasis.options.map((value) => ({
  value,
  label: value.charAt(0).toUpperCase() + value.slice(1),
}));
