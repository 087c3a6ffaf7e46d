import type { PhotoDto } from '#shared/schemas/photo.ts';
import type { GliderPhoto } from '#server/models/glider-photo.ts';

export function presentPhoto(row: GliderPhoto, addedBy: string): PhotoDto {
  return {
    id: row.id,
    gliderId: row.gliderId,
    caption: row.caption,
    width: row.width,
    height: row.height,
    addedAt: row.addedAt.toISOString(),
    addedBy,
  };
}
