import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import {
  stockPieceInput,
  type StockKind,
  type StockMaterial,
  type StockPieceInput,
} from '#shared/schemas/stock-piece.ts';

/** A piece as it stands in a form. NaN is a text that is no number, null an empty field. */
export interface PieceDraft {
  kind: StockKind;
  material: StockMaterial | null;
  length: number | null;
  width: number | null;
  thickness: number | null;
  wall: number | null;
  mass: number | null;
  resolution: number | null;
  grade: string;
  grainCut: StockPieceInput['grainCut'];
  note: string;
}

export const BLANK_PIECE: PieceDraft = {
  kind: 'sheet',
  material: null,
  length: null,
  width: null,
  thickness: null,
  wall: null,
  mass: null,
  resolution: null,
  grade: '',
  grainCut: null,
  note: '',
};

export type DraftErrors = Partial<Record<keyof PieceDraft | 'root', string>>;

/** What a form holds as a piece, or what is wrong with it by field. */
export function pieceOf(draft: PieceDraft): { input: StockPieceInput } | { errors: DraftErrors } {
  const tube = draft.kind === 'tube';
  const wall = tube ? (draft.wall ?? (draft.width === null ? null : draft.width / 2)) : null;
  const thickness = tube ? draft.width : draft.thickness;
  const resolution = draft.mass === null ? null : draft.resolution;
  const grainCut = draft.kind === 'sheet' ? draft.grainCut : null;
  const parsed = stockPieceInput.safeParse({ ...draft, wall, thickness, resolution, grainCut });
  if (parsed.success) return { input: parsed.data };
  const errors: DraftErrors = {};
  for (const { path, message } of parsed.error.issues) {
    const field = fieldOf(path[0], tube);
    errors[field] ??= worded(draft, field, message);
  }
  return { errors };
}

function fieldOf(name: PropertyKey | undefined, tube: boolean): keyof DraftErrors {
  if (name === 'thickness' && tube) return 'width';
  return typeof name === 'string' && name in BLANK_PIECE ? (name as keyof PieceDraft) : 'root';
}

function worded(draft: PieceDraft, field: keyof DraftErrors, message: string): string {
  const value = field === 'root' ? undefined : draft[field];
  if (value === null) return field === 'material' ? 'Choose a material.' : 'Type a number.';
  return Number.isNaN(value) ? 'Not a number. Write 12.5, 1/16 or 3 1/2 in.' : message;
}

/** The form for one more of the same size; only its mass is still to be weighed. */
export const nextLike = (draft: PieceDraft): PieceDraft => ({ ...draft, mass: null, note: '' });

/** A stored piece as a form holds it. */
export function draftOf(piece: StockPieceInput): PieceDraft {
  const { kind, material, length, width, thickness, wall, mass, resolution, grade, grainCut, note } = piece;
  return { kind, material, length, width, thickness, wall, mass, resolution, grade, grainCut, note };
}

/** Nothing is cut from coverings, finishes and glue. */
const NOT_STOCK = new Set(['covering', 'finish', 'adhesive']);

/** What a piece may be made of; one that is in the table no more stays to be chosen. */
export function stockMaterials(table: readonly TableMaterial[], now: StockMaterial | null): StockMaterial[] {
  const rows = table
    .filter(({ material }) => !NOT_STOCK.has(material.category))
    .map(({ key, material: { name, category } }): StockMaterial => ({ key, name, category }));
  return now === null || rows.some(({ key }) => key === now.key) ? rows : [now, ...rows];
}
