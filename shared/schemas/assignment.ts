import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { lengthOrNothing, within } from './plan-parts.ts';
import { stockFields, stockState } from './stock-piece.ts';

/** One of the pieces that a line of the estimate is cut as, and where it comes from. */
export const assignmentEntry = z.strictObject({
  /** `<surface>/<id>`, `solid/<id>` */
  line: z
    .string()
    .min(1, 'Must not be empty.')
    .max(2 * LIMITS.key.max + 1),
  /** which of the line's pieces, from 0 */
  n: z.int().min(0).max(LIMITS.parts.max),
  side: z.enum(['port', 'starboard']).nullable(),
  /** the blank, mm; a measure that does not matter is 0 */
  length: lengthOrNothing(),
  width: lengthOrNothing(),
  thickness: lengthOrNothing(),
  /** the stock piece that it is cut from; null for what is to be bought or not placed yet */
  pieceId: z.uuid().nullable(),
  /** where on that piece: from its end and from its edge, mm; null where that is left open */
  at: z.tuple([lengthOrNothing(), lengthOrNothing()]).nullable(),
  /** put there by hand: solving again leaves it */
  fixed: z.boolean(),
});

const assignmentFields = {
  entries: z.array(assignmentEntry).max(LIMITS.parts.max, `Keep at most ${LIMITS.parts.max} pieces.`),
  terms: z.strictObject({
    aim: z.enum(['lightest', 'matched', 'strongest']),
    /** mm */
    kerf: lengthOrNothing(),
    /** shorter ones are waste, mm */
    shortestOffcut: lengthOrNothing(),
    /** port against starboard: g, and g·mm about the root; null where it does not matter */
    massTolerance: within(0, LIMITS.massG.max).nullable(),
    momentTolerance: within(0, LIMITS.massG.max * LIMITS.lengthMm.max).nullable(),
    /** how the best known answer lies to the bound, as a fraction; null for an answer by hand */
    gap: within(0, 1e6).nullable(),
    /** how it was found, in words */
    note: z.string().trim().max(LIMITS.note.max),
  }),
  /** the saved plan that it was made for */
  gliderVersion: z.int().min(1),
};

export const assignmentInput = z.strictObject(assignmentFields);

/** A stock piece as every member of the glider sees it. */
export const assignedPiece = z.strictObject({
  id: z.uuid(),
  number: z.int(),
  ownerName: z.string(),
  /** in the asker's own rack */
  own: z.boolean(),
  kind: stockFields.kind,
  material: stockFields.material,
  length: z.number(),
  width: z.number(),
  thickness: z.number(),
  wall: z.number().nullable(),
  mass: z.number().nullable(),
  density: z.number().nullable(),
  grade: z.string(),
  grainCut: stockFields.grainCut,
  state: stockState,
  /** reserved for or used in this glider; false where its owner has taken it back */
  held: z.boolean(),
});

export const gliderAssignment = z.strictObject({
  ...assignmentFields,
  /** 1 while nobody has kept one; also the ETag */
  version: z.int(),
  /** every piece that an entry names and that still exists */
  pieces: z.array(assignedPiece),
  updatedAt: z.iso.datetime().nullable(),
  updatedBy: z.string().nullable(),
});

export type AssignmentEntry = z.infer<typeof assignmentEntry>;
export type AssignmentInput = z.infer<typeof assignmentInput>;
export type AssignedPiece = z.infer<typeof assignedPiece>;
export type GliderAssignmentDto = z.infer<typeof gliderAssignment>;
