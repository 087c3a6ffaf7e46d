import type { AssignedPiece, AssignmentInput, GliderAssignmentDto } from '#shared/schemas/assignment.ts';
import type { GliderAssignment } from '#server/models/glider-assignment.ts';
import type { StockPiece } from '#server/models/stock-piece.ts';
import { presentStockFields } from './stock-piece.ts';

/** Before anybody has kept one: nothing is placed, and cuts are as a fine saw leaves them. */
const NONE = {
  entries: [],
  terms: {
    aim: 'lightest',
    kerf: 1,
    shortestOffcut: 50,
    massTolerance: null,
    momentTolerance: null,
    gap: null,
    note: '',
  },
} as const satisfies Pick<AssignmentInput, 'entries' | 'terms'>;

interface Context {
  /** the glider as it is saved now */
  glider: { id: string; version: number };
  /** pieces that the entries name, with their owners' names */
  pieces: readonly StockPiece[];
  actorId: string;
}

export function presentGliderAssignment(
  row: GliderAssignment | null,
  { glider, pieces, actorId }: Context,
): GliderAssignmentDto {
  return {
    entries: row?.entries ?? [...NONE.entries],
    terms: row?.terms ?? NONE.terms,
    gliderVersion: row?.gliderVersion ?? glider.version,
    version: row?.version ?? 1,
    pieces: pieces.map((piece) => presentAssignedPiece(piece, glider.id, actorId)),
    updatedAt: row?.updatedAt.toISOString() ?? null,
    updatedBy: row?.editor?.name ?? null,
  };
}

/** What every member of the glider sees of a piece: what it is, and not what its owner noted on it. */
function presentAssignedPiece(row: StockPiece, gliderId: string, actorId: string): AssignedPiece {
  const { note: _, resolution: __, ...fields } = presentStockFields(row);
  return {
    ...fields,
    id: row.id,
    number: row.number,
    ownerName: row.user?.name ?? '',
    own: row.userId === actorId,
    density: row.density,
    state: row.state,
    held: row.gliderId === gliderId,
  };
}
