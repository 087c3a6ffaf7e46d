import type { ImportPreviewDto } from '#shared/schemas/rack.ts';

export interface DecodedTable {
  encoding: ImportPreviewDto['encoding'];
  /** without the mark at its beginning, lines ending in a line feed */
  text: string;
}

/**
 * Reads the bytes of a table as text: by the mark at their beginning, else as UTF-16 where every other byte of the
 * beginning is 0, else as UTF-8, and where they are not that, as Windows’ western code page.
 */
export function decodeTable(bytes: Buffer): DecodedTable {
  const { encoding, label } = encodingOf(bytes);
  const text = new TextDecoder(label).decode(bytes);
  return { encoding, text: text.replace(/\r\n?/g, '\n') };
}

type Label = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

function encodingOf(bytes: Buffer): { encoding: DecodedTable['encoding']; label: Label } {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return { encoding: 'utf-16', label: 'utf-16le' };
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return { encoding: 'utf-16', label: 'utf-16be' };
  const start = bytes.subarray(0, 200);
  const noughts = (odd: 0 | 1) => start.filter((byte, i) => byte === 0 && i % 2 === odd).length;
  // Most of what a header is made of is in the first 256 characters.
  if (noughts(1) > start.length / 4) return { encoding: 'utf-16', label: 'utf-16le' };
  if (noughts(0) > start.length / 4) return { encoding: 'utf-16', label: 'utf-16be' };
  return isUtf8(bytes)
    ? { encoding: 'utf-8', label: 'utf-8' }
    : { encoding: 'windows-1252', label: 'windows-1252' };
}

function isUtf8(bytes: Buffer): boolean {
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return true;
  } catch {
    return false;
  }
}
