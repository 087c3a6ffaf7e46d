import { GliderAssignment } from '#server/models/glider-assignment.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { listPiecesOfUser } from './rack.ts';
import { readPicture } from './stored-files.ts';

/** A user's rack as one JSON list in pieces, each with its photo, so that no two photos are held at a time. */
export async function* exportRack(userId: string): AsyncGenerator<string> {
  const pieces = await listPiecesOfUser(userId);
  const rows = await StockPiece.findAll({ where: { userId }, attributes: ['id', 'photoFile'] });
  const files = new Map(rows.map(({ id, photoFile }) => [id, photoFile]));
  yield '[';
  for (const [i, piece] of pieces.entries()) {
    const file = files.get(piece.id);
    const jpeg = file ? await readPicture(file, 'image') : null;
    const photo = jpeg && { photoJpegBase64: jpeg.toString('base64') };
    yield `${i === 0 ? '' : ','}${JSON.stringify({ ...piece, ...photo })}`;
  }
  yield ']';
}

/** What a glider keeps of its choice of wood; null where nothing is kept. */
export async function exportAssignment(gliderId: string) {
  const row = await GliderAssignment.findByPk(gliderId);
  return row && { entries: row.entries, terms: row.terms, gliderVersion: row.gliderVersion };
}
