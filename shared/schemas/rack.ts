import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { length, lengthOrNothing } from './plan-parts.ts';
import { stockKind, stockPiece, stockPieceInput, stockState } from './stock-piece.ts';

/** What a rack may be ordered by. */
export const rackOrder = z.enum(['number', 'material', 'density', 'mass', 'length', 'thickness']);
/** Which pieces: `onRack` is free and reserved. */
export const rackState = z.enum(['onRack', ...stockState.options]);
export const rackKind = stockKind;

export const rackList = z.strictObject({
  pieces: z.array(stockPiece),
  /** give it back as `?cursor=` for the next page; null on the last */
  nextCursor: z.string().nullable(),
});

/** All cuts in one direction; what is left becomes a piece too. */
export const splitInput = z.strictObject({
  /** the measure that is divided */
  along: z.enum(['length', 'width']),
  /** of the pieces wanted, in that measure, mm */
  wanted: z
    .array(length())
    .min(1, 'Name at least one piece.')
    .max(LIMITS.splitParts.max, `Split into at most ${LIMITS.splitParts.max} pieces at once.`),
  /** what one cut takes away, mm */
  kerf: lengthOrNothing(),
});
export const splitResult = z.strictObject({
  /** the pieces wanted, in their order, and what is left as the last one */
  pieces: z.array(stockPiece),
  /** what the saw took, g; with the masses of the pieces exactly the mass of the whole; null where not weighed */
  lost: z.number().nullable(),
});

export const reservationInput = z.strictObject({ gliderId: z.uuid() });

export const useInput = z.strictObject({
  /** null for what is no glider here */
  gliderId: z.uuid().nullable(),
  /** what goes back on the rack, mm; as thick as the piece */
  leftovers: z
    .array(z.strictObject({ length: length(), width: length() }))
    .max(LIMITS.splitParts.max, `Put at most ${LIMITS.splitParts.max} leftovers back.`),
});
export const useResult = z.strictObject({ piece: stockPiece, leftovers: z.array(stockPiece) });

/** A line of the file that cannot be read as a piece. */
const badLine = z.strictObject({
  /** counted from 1 as an editor counts */
  line: z.int(),
  /** as it stands in the file, shortened */
  text: z.string(),
  problems: z.array(z.strictObject({ column: z.string().nullable(), detail: z.string() })),
});
const goodLine = z.strictObject({
  line: z.int(),
  piece: stockPieceInput,
  /** what should be looked at before it is taken in: a density that no wood has */
  doubt: z.string().nullable(),
});

/** What a file would bring in; nothing is stored yet. */
export const importPreview = z.strictObject({
  encoding: z.enum(['utf-8', 'utf-16', 'windows-1252']),
  delimiter: z.enum([',', ';', '\t']),
  columns: z.array(
    z.strictObject({
      header: z.string(),
      /** null for a column that is not looked at */
      field: z.string().nullable(),
      /** of the column, where its header names one or the field has a usual one */
      unit: z.string().nullable(),
    }),
  ),
  rows: z.array(goodLine),
  bad: z.array(badLine),
});
/** The file itself is the part `file` of the form. */
export const importForm = z.strictObject({});
export const importInput = z.strictObject({
  rows: z
    .array(stockPieceInput)
    .min(1, 'There is nothing to take in.')
    .max(LIMITS.rackImport.max, `Take in at most ${LIMITS.rackImport.max} pieces at once.`),
});
export const importResult = z.strictObject({
  count: z.int(),
  /** labels of the first and the last; they count up without a gap in the order of the rows */
  firstNumber: z.int(),
  lastNumber: z.int(),
});

export const pieceInUse = z.strictObject({ id: z.uuid(), number: z.int().nullable(), detail: z.string() });

export type RackOrder = z.infer<typeof rackOrder>;
export type RackState = z.infer<typeof rackState>;
export type RackListDto = z.infer<typeof rackList>;
export type SplitInput = z.infer<typeof splitInput>;
export type SplitResultDto = z.infer<typeof splitResult>;
export type UseInput = z.infer<typeof useInput>;
export type UseResultDto = z.infer<typeof useResult>;
export type ImportPreviewDto = z.infer<typeof importPreview>;
export type ImportInput = z.infer<typeof importInput>;
export type ImportResultDto = z.infer<typeof importResult>;
export type PieceInUse = z.infer<typeof pieceInUse>;
