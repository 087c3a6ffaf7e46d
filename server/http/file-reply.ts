import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { createGzip } from 'node:zlib';
import type { Response } from 'express';
import { takesGzip } from './packed.ts';

/** A file as an answer: bytes that never change under their tag, or a text that is written while it is sent. */
export type FileReply = { bytes: Buffer; tag: string } | { text: AsyncIterable<string>; name: string };

/**
 * A picture may be shown from the browser's own store, but only after asking whether its reader may still see it.
 * Nothing in the file can run, whatever somebody has put into it.
 */
export async function sendFile(res: Response, mediaType: string, file: FileReply): Promise<void> {
  res.set('Content-Security-Policy', "default-src 'none'; sandbox");
  res.type(mediaType);
  if ('bytes' in file) {
    res.set({ 'Cache-Control': 'private, no-cache', 'Content-Disposition': 'inline', ETag: `"${file.tag}"` });
    if (res.req.fresh) res.status(304).removeHeader('Content-Type');
    res.end(res.req.fresh || res.req.method === 'HEAD' ? undefined : file.bytes);
    return;
  }
  // The name decides over the type, and the type was given.
  res.attachment(file.name).type(mediaType).vary('Accept-Encoding');
  const text = Readable.from(file.text);
  if (!takesGzip(res)) return pipeline(text, res);
  res.set('Content-Encoding', 'gzip');
  return pipeline(text, createGzip(), res);
}
