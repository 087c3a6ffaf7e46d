import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { extname, join, resolve } from 'node:path';
import express, { Router, type RequestHandler, type Response } from 'express';

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

/** Sends the packed twin that the build laid beside a file to whoever takes it. */
function packedFiles(folder: string): RequestHandler {
  const twins = new Set(existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith('.gz')) : []);
  return (req, res, next) => {
    const name = `${req.path.slice(1)}.gz`;
    if (!twins.has(name)) return next();
    res.vary('Accept-Encoding');
    if (!req.acceptsEncodings('gzip')) return next();
    res.set('Content-Encoding', 'gzip').type(extname(req.path));
    return res.sendFile(name, { root: folder, immutable: true, maxAge: '365d' }, (error) => {
      if (error) next(error);
    });
  };
}

function sendPage(res: Response, page: string | null): void {
  res.set('Cache-Control', 'no-cache');
  if (page === null) {
    res
      .status(503)
      .type('text/plain')
      .send('The pages have not been built yet. Run the build and start again.');
    return;
  }
  res.type('html').send(page);
}
