import { crc32, deflateSync } from 'node:zlib';
import sharp, { type Sharp } from 'sharp';
import { GliderPhoto } from '#server/models/glider-photo.ts';
import type { Glider } from '#server/models/glider.ts';
import type { User } from '#server/models/user.ts';
import { addPhoto } from '#server/services/photos.ts';

/** A picture of one colour. */
export function picture(width = 40, height = 30): Sharp {
  return sharp({ create: { width, height, channels: 3, background: '#1d4f91' } });
}

/** A part of a PNG file: length, kind, content, check sum (PNG specification, 5.3). */
function chunk(kind: string, content: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(kind, 'latin1'), content]);
  const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)];
  length.writeUInt32BE(content.length);
  sum.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, sum]);
}

/** A black PNG of one bit a pixel: a few kilobytes that unpack to any size. */
export function bomb(side: number): Buffer {
  const head = Buffer.alloc(13);
  head.writeUInt32BE(side, 0);
  head.writeUInt32BE(side, 4);
  head.writeUInt8(1, 8);
  const rows = Buffer.alloc(side * (Math.ceil(side / 8) + 1));
  const mark = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return Buffer.concat([
    mark,
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(rows)),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

let small: Promise<Buffer> | undefined;

/** A small picture as a camera would send it. */
export const smallPicture = () => (small ??= picture().jpeg().toBuffer());

export async function makePhoto(glider: Glider, by: User, caption = ''): Promise<GliderPhoto> {
  const bytes = await smallPicture();
  const { id } = await addPhoto(by, { gliderId: glider.id, bytes, caption, key: undefined });
  return GliderPhoto.findByPk(id, { rejectOnEmpty: true });
}
