import { balsaGrade } from '#shared/core/grades.ts';
import type { Units } from '#shared/format/units.ts';
import type { StockKind, StockMaterial, StockPieceDto, StockState } from '#shared/schemas/stock-piece.ts';

export const KIND_WORDS: Record<StockKind, string> = {
  sheet: 'Sheet',
  stick: 'Stick',
  block: 'Block',
  tube: 'Tube or rod',
};
export const STATE_WORDS: Record<StockState, string> = {
  free: 'Free',
  reserved: 'Reserved',
  used: 'Used',
  split: 'Cut up',
};

const GRADE_WORDS: Record<ReturnType<typeof balsaGrade>, string> = {
  under: 'lighter than contest grade',
  contest: 'contest grade',
  light: 'light',
  medium: 'medium',
  'medium-hard': 'medium-hard',
  hard: 'hard',
  over: 'heavier than hard',
};

/** Grades are told for balsa only; nothing else is sold by them. */
export function isBalsa({ key, name }: Pick<StockMaterial, 'key' | 'name'>): boolean {
  return (key ?? '').startsWith('balsa') || /\bbalsa\b/i.test(name);
}

/** The band that a density falls in; null for what is no balsa, or has no density. */
export function gradeWord(material: StockMaterial, density: number | null): string | null {
  return density === null || !isBalsa(material) ? null : GRADE_WORDS[balsaGrade(density)];
}

export interface Measured {
  kind: StockKind;
  length: number;
  width: number;
  thickness: number;
  wall: number | null;
}

/** `914.4 × 76.2 × 1.59 mm`, and of a tube `⌀ 6 × 1000 mm, wall 1 mm`. */
export function sizeText({ kind, length, width, thickness, wall }: Measured, units: Units): string {
  const bare = (value: number) => units.size(value, { bare: true });
  if (kind !== 'tube') return `${bare(length)} × ${bare(width)} × ${units.size(thickness)}`;
  const size = `⌀ ${bare(width)} × ${units.size(length)}`;
  return wall === null || wall * 2 >= width ? `${size}, solid` : `${size}, wall ${units.size(wall)}`;
}

/** `Piece 12, sheet of Balsa, light` */
export function pieceName({ number, kind, material }: Pick<StockPieceDto, 'number' | 'kind' | 'material'>) {
  return `Piece ${number}, ${KIND_WORDS[kind].toLowerCase()} of ${material.name}`;
}
