import { describe, expect, it } from 'vitest';
import { woodOfPiece } from '#client/features/trial/rack-woods.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

const piece: StockPieceDto = {
  id: '6f4f7f4e-2b1d-4c57-9c9b-0d3f6f0a5b11',
  number: 12,
  kind: 'sheet',
  material: { key: 'balsa-light', name: 'Balsa, light', category: 'wood' },
  length: 915,
  width: 76,
  thickness: 1.5,
  wall: null,
  mass: 10.4,
  resolution: 0.1,
  grade: '',
  grainCut: 'A',
  note: '',
  state: 'free',
  weighed: true,
  density: 100,
  reservedFor: null,
  usedIn: null,
  parent: null,
  hasPhoto: false,
  version: 1,
  createdAt: '2026-05-02T10:00:00.000Z',
  updatedAt: '2026-05-02T10:00:00.000Z',
};
const table = [
  {
    key: 'balsa-light',
    material: {
      name: 'Balsa, light',
      category: 'wood' as const,
      density: 125,
      cv: 0.1,
      modulus: 2,
      strength: 10,
    },
  },
];

describe('a piece of the rack as a wood to try', () => {
  it('has the density that it was weighed to, and strength and modulus in proportion', () => {
    expect(woodOfPiece(piece, table)).toEqual({
      key: 'rack-12',
      material: {
        name: 'No. 12, Balsa, light',
        category: 'wood',
        density: 100,
        cv: 0.02,
        modulus: 1.6,
        strength: 8,
        source: 'Weighed',
      },
    });
    expect(woodOfPiece(piece, [])?.material).not.toHaveProperty('strength');
  });

  it('is none where it was not weighed or is no wood', () => {
    expect(woodOfPiece({ ...piece, density: null }, table)).toBeNull();
    expect(woodOfPiece({ ...piece, weighed: false }, table)).toBeNull();
    expect(
      woodOfPiece({ ...piece, material: { ...piece.material, category: 'composite' } }, table),
    ).toBeNull();
  });
});
