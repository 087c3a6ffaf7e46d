import { z } from 'zod';
import { volumeOfStock } from '#shared/core/stock.ts';
import { LIMITS } from './limits.ts';
import { materialCategory } from './material.ts';
import { identifier, length, positive, title } from './plan-parts.ts';

export const stockKind = z.enum(['sheet', 'stick', 'block', 'tube']);
/** How a sheet was sawn from the log: A bends round a nose, C is stiff across, B lies between. */
export const grainCut = z.enum(['A', 'B', 'C']);
/** `split` is cut up into other pieces, `used` built into something. */
export const stockState = z.enum(['free', 'reserved', 'used', 'split']);

/** What a piece is made of; a copy, so that the piece keeps it whatever becomes of the table's row. */
export const stockMaterial = z.strictObject({
  /** key in the table of materials; null for what is in nobody's */
  key: identifier().nullable(),
  name: title(),
  category: materialCategory,
});

/** Mass in g; null for a piece that was not weighed. */
const mass = positive(LIMITS.massG.max).nullable();

export const stockFields = {
  kind: stockKind,
  material: stockMaterial,
  /** along the grain, mm */
  length: length(),
  width: length(),
  /** equal to the width for a tube, whose outer diameter both are */
  thickness: length(),
  /** of a tube, half its diameter for a solid rod; null for everything else, mm */
  wall: length().nullable(),
  mass,
  /** the smallest step that the scale shows, g */
  resolution: positive(LIMITS.massG.max).nullable(),
  /** in the builder's words */
  grade: z.string().trim().max(LIMITS.name.max),
  grainCut: grainCut.nullable(),
  note: z.string().trim().max(LIMITS.note.max),
};
const stockShape = z.strictObject(stockFields);

/** What is wrong with fields that are right each by itself, by their names. */
function stockIssues(piece: z.infer<typeof stockShape>): { path: string[]; message: string }[] {
  const issues: { path: string[]; message: string }[] = [];
  const { kind, width, thickness, wall } = piece;
  if (kind !== 'tube' && wall !== null) {
    issues.push({ path: ['wall'], message: 'Only a tube has a wall.' });
  }
  if (kind === 'tube') {
    if (wall === null) {
      issues.push({ path: ['wall'], message: 'Give the wall; of a solid rod it is half the diameter.' });
    } else if (wall > width / 2) {
      issues.push({ path: ['wall'], message: 'Must be at most half the diameter.' });
    }
    if (thickness !== width) issues.push({ path: ['thickness'], message: 'A tube is as thick as wide.' });
  }
  if (piece.resolution !== null && piece.mass === null) {
    issues.push({ path: ['resolution'], message: 'Nothing was weighed.' });
  }
  const volume = volumeOfStock(piece);
  if (issues.length === 0 && piece.mass !== null && (piece.mass / volume) * 1e6 > LIMITS.density.max) {
    const message = 'No material is so heavy for its size; check both, and their units.';
    issues.push({ path: ['mass'], message });
  }
  return issues;
}

export const stockPieceInput = stockShape.check(
  z.superRefine((piece, ctx) => {
    for (const issue of stockIssues(piece)) ctx.addIssue({ code: 'custom', ...issue });
  }),
);

const ofGlider = z.strictObject({ id: z.uuid(), name: z.string() }).nullable();

export const stockPiece = z.strictObject({
  ...stockFields,
  id: z.uuid(),
  /** on its label; counts up for each user and is never given twice */
  number: z.int(),
  state: stockState,
  /** read from a scale, and not worked out from the piece that it was cut from */
  weighed: z.boolean(),
  /** kg/m³; null without a mass */
  density: z.number().nullable(),
  /** null where it is not reserved, and where its owner does not see the glider any more */
  reservedFor: ofGlider,
  /** null where it is not used, is used for no glider here, or its owner does not see that glider any more */
  usedIn: ofGlider,
  /** the piece that it was cut from */
  parent: z.strictObject({ id: z.uuid(), number: z.int() }).nullable(),
  hasPhoto: z.boolean(),
  version: z.int(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
});

export type StockKind = z.infer<typeof stockKind>;
export type StockState = z.infer<typeof stockState>;
export type StockMaterial = z.infer<typeof stockMaterial>;
export type StockPieceInput = z.infer<typeof stockPieceInput>;
export type StockPieceDto = z.infer<typeof stockPiece>;
