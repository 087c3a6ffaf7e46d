export type PictureType = 'JPEG' | 'PNG' | 'WebP' | 'AVIF' | 'HEIC';

const startsWith = (bytes: Buffer, mark: readonly number[]) => mark.every((byte, i) => bytes[i] === byte);

/**
 * What a file is by its first bytes, whatever it is called; null for anything that is no picture that a camera or a
 * drawing program makes. Vector pictures and documents are not even looked into.
 */
export function pictureType(bytes: Buffer): PictureType | null {
  if (startsWith(bytes, [0xff, 0xd8, 0xff])) return 'JPEG';
  if (startsWith(bytes, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return 'PNG';
  const text = bytes.toString('latin1', 0, 16);
  if (text.startsWith('RIFF') && text.slice(8, 12) === 'WEBP') return 'WebP';
  if (text.slice(4, 8) !== 'ftyp') return null;
  const brand = text.slice(8, 12);
  if (brand === 'avif' || brand === 'avis') return 'AVIF';
  return /^(hei[cxms]|hev[cxms]|mif1|msf1)$/.test(brand) ? 'HEIC' : null;
}
