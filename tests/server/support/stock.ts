import type { AssignmentInput } from '#shared/schemas/assignment.ts';
import type { StockPieceDto, StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import type { User } from '#server/models/user.ts';
import { createPiece } from '#server/services/rack.ts';
import type { TestApp } from './app.ts';

/** A weighed sheet of balsa: 36 × 4 × 1/16 in. */
export const SHEET: StockPieceInput = {
  kind: 'sheet',
  material: { key: 'balsa-light', name: 'Balsa, light', category: 'wood' },
  length: 914.4,
  width: 101.6,
  thickness: 1.5875,
  wall: null,
  mass: 17.7,
  resolution: 0.1,
  grade: 'light',
  grainCut: 'C',
  note: '',
};

export const STICK: StockPieceInput = {
  ...SHEET,
  kind: 'stick',
  material: { key: 'spruce', name: 'Spruce', category: 'wood' },
  length: 1000,
  width: 5,
  thickness: 3,
  mass: 6.4,
  grade: '',
  grainCut: null,
};

export const TUBE: StockPieceInput = {
  ...STICK,
  kind: 'tube',
  material: { key: null, name: 'Carbon tube', category: 'composite' },
  width: 6,
  thickness: 6,
  wall: 0.5,
  mass: 13.1,
};

export const makePiece = (user: User, changes: Partial<StockPieceInput> = {}): Promise<StockPieceDto> =>
  createPiece(user, { ...SHEET, ...changes }, undefined);

export const pieceRow = (id: string) => StockPiece.findByPk(id, { rejectOnEmpty: true });

/** Puts so many pieces of many sizes on a rack at once, some of them unweighed, used or split. */
export async function fillRack(app: TestApp, user: User, count: number): Promise<void> {
  const replacements = { userId: user.id, count };
  await app.sequelize.query(
    `INSERT INTO stock_pieces (id, user_id, number, kind, material_name, material_category, length_mm, width_mm,
       thickness_mm, mass_g, density_kg_m3, grade, note, state, weighed)
     SELECT gen_random_uuid(), :userId, n, CASE n % 3 WHEN 0 THEN 'stick' ELSE 'sheet' END,
       'Balsa ' || (n * 7919) % 101, 'wood', 300 + (n * 104729) % 701, 100, 1 + (n * 31) % 7,
       CASE WHEN n % 11 = 0 THEN NULL ELSE 1 + (n * 7919) % 83 END,
       CASE WHEN n % 11 = 0 THEN NULL ELSE 80 + (n * 7919) % 211 END,
       '', '', CASE n % 5 WHEN 4 THEN 'used' ELSE 'free' END, n % 11 > 0
     FROM generate_series(1, :count) AS n`,
    { replacements },
  );
  await app.sequelize.query('INSERT INTO rack_counters (user_id, last_number) VALUES (:userId, :count)', {
    replacements,
  });
}

const BLANK = { side: null, length: 60, width: 12, thickness: 1.5875, at: null, fixed: false } as const;

/** An assignment that cuts ribs, one after the other, from these pieces; null for one to be bought. */
export const assignmentOf = (...pieceIds: (string | null)[]): AssignmentInput => ({
  entries: pieceIds.map((pieceId, n) => ({ ...BLANK, line: 'wing/ribs', n, pieceId })),
  terms: {
    aim: 'matched',
    kerf: 0.5,
    shortestOffcut: 50,
    massTolerance: 0.2,
    momentTolerance: null,
    gap: 0.01,
    note: 'Exact within the gap',
  },
  gliderVersion: 1,
});
