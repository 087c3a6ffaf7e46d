import type { StockPieceDto, StockPieceInput } from '#shared/schemas/stock-piece.ts';
import type { StockPiece } from '#server/models/stock-piece.ts';

/** What its owner may change, as it is now. */
export function presentStockFields(row: StockPiece): StockPieceInput {
  return {
    kind: row.kind,
    material: { key: row.materialKey, name: row.materialName, category: row.materialCategory },
    length: row.length,
    width: row.width,
    thickness: row.thickness,
    wall: row.wall,
    mass: row.mass,
    resolution: row.resolution,
    grade: row.grade,
    grainCut: row.grainCut,
    note: row.note,
  };
}

/** `gliders` are names, by id, of those that the owner of the piece sees. */
export function presentStockPiece(row: StockPiece, gliders: ReadonlyMap<string, string>): StockPieceDto {
  const name = row.gliderId === null ? undefined : gliders.get(row.gliderId);
  const glider = row.gliderId === null || name === undefined ? null : { id: row.gliderId, name };
  return {
    ...presentStockFields(row),
    id: row.id,
    number: row.number,
    state: row.state,
    weighed: row.weighed,
    density: row.density,
    reservedFor: row.state === 'reserved' ? glider : null,
    usedIn: row.state === 'used' ? glider : null,
    parent:
      row.parentId === null || row.parentNumber === null
        ? null
        : { id: row.parentId, number: row.parentNumber },
    hasPhoto: row.photoFile !== null,
    version: row.version,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}
