import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { extname, join, resolve } from 'node:path';
import express, { Router, type RequestHandler, type Response } from 'express';
import { sendText } from '#server/http/packed.ts';

/** The built client: its page, and the hashes of the scripts that stand in it. */
export interface Client {
  folder: string;
  page: string | null;
  scriptHashes: string[];
}

/** Reads the built client; `page` is null where it has not been built. */
export function readClient(folder: string): Client {
  const file = join(folder, 'index.html');
  const page = existsSync(file) ? readFileSync(file, 'utf8') : null;
  return { folder: resolve(folder), page, scriptHashes: page === null ? [] : inlineScriptHashes(page) };
}

/** Hash sources of Content-Security-Policy for every script whose text stands in the page. */
export function inlineScriptHashes(page: string): string[] {
  return [...page.matchAll(/<script\b([^>]*)>([\s\S]*?)<\/script\s*>/gi)]
    .filter(([, attributes = '']) => !/\bsrc\s*=/i.test(attributes))
    .map(([, , text = '']) => `sha256-${createHash('sha256').update(text).digest('base64')}`);
}

/** Serves the client: hashed files for ever, its page for every address that is not the API's or a file's. */
export function clientFiles(client: Client): Router {
  const router = Router();
  router.use('/assets', packedFiles(join(client.folder, 'assets')));
  router.use(
    '/assets',
    express.static(join(client.folder, 'assets'), { immutable: true, maxAge: '365d', fallthrough: false }),
  );
  router.use(express.static(client.folder, { index: false, maxAge: 0 }));
  router.get(/^\/(?!api(?:\/|$))/, (_req, res) => sendPage(res, client.page));
  return router;
}

/** How the build packs, by the ending of the packed twin; the tighter first. */
const TWINS = { br: '.br', gzip: '.gz' } as const;

/** Sends the packed twin that the build laid beside a file to whoever takes it. */
function packedFiles(folder: string): RequestHandler {
  const names = new Set(existsSync(folder) ? readdirSync(folder) : []);
  return (req, res, next) => {
    const name = req.path.slice(1);
    const encodings = (['br', 'gzip'] as const).filter((encoding) => names.has(name + TWINS[encoding]));
    if (encodings.length === 0) return next();
    res.vary('Accept-Encoding');
    const encoding = encodings.find((one) => req.acceptsEncodings(one));
    if (encoding === undefined) return next();
    res.set('Content-Encoding', encoding).type(extname(name));
    const options = { root: folder, immutable: true, maxAge: '365d' };
    return res.sendFile(name + TWINS[encoding], options, (error) => {
      if (error) next(error);
    });
  };
}

async function sendPage(res: Response, page: string | null): Promise<void> {
  res.set('Cache-Control', 'no-cache');
  if (page === null) {
    res
      .status(503)
      .type('text/plain')
      .send('The pages have not been built yet. Run the build and start again.');
    return;
  }
  await sendText(res, 'text/html', page);
}
