import { promisify } from 'node:util';
import { gzip } from 'node:zlib';
import type { Response } from 'express';

const pack = promisify(gzip);

/** Below this packing saves nothing. */
const WORTH_PACKING = 1_024;

export const takesGzip = ({ req }: Response) => req.acceptsEncodings('gzip') === 'gzip';

/** Sends a text, packed where it is long and the asker can unpack it. */
export async function sendText(res: Response, mediaType: string, text: string): Promise<void> {
  const plain = Buffer.from(text);
  res.type(mediaType).vary('Accept-Encoding');
  if (plain.length < WORTH_PACKING || !takesGzip(res)) {
    res.send(plain);
    return;
  }
  const packed = await pack(plain);
  res.set('Content-Encoding', 'gzip').send(packed);
}
