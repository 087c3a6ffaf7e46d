import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { afterAll, describe, expect, it } from 'vitest';
import { inlineScriptHashes } from '#server/middleware/client-files.ts';
import { useApp } from '../support/app.ts';
import { expectProblem } from '../support/problems.ts';

const SCRIPT = "document.documentElement.classList.add('dark')";
const PAGE = `<!doctype html><script>${SCRIPT}</script><script type="module" src="/assets/app-1a2b.js"></script>`;

const folder = mkdtempSync(join(tmpdir(), 'client-'));
mkdirSync(join(folder, 'assets'));
writeFileSync(join(folder, 'index.html'), PAGE);
writeFileSync(join(folder, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
writeFileSync(join(folder, 'assets', 'app-1a2b.js'), 'export {}');
writeFileSync(join(folder, 'assets', 'packed-3c4d.js'), 'export const long = 1;');
writeFileSync(join(folder, 'assets', 'packed-3c4d.js.gz'), gzipSync('export const long = 1;'));
writeFileSync(join(folder, 'assets', 'packed-3c4d.js.br'), brotliCompressSync('export const long = 1;'));

afterAll(() => rmSync(folder, { recursive: true }));

describe('a built client', () => {
  const app = useApp({ clientDir: folder });

  it('answers every address of a page with the one page, to be asked for anew each time', async () => {
    for (const path of ['/', '/gliders/7/balance', '/apiary']) {
      const res = await app.visitor().get(path).expect(200);
      expect(res.text).toBe(PAGE);
      expect(res.headers['cache-control']).toBe('no-cache');
    }
  });

  it('keeps hashed files for ever and others not', async () => {
    const asset = await app.visitor().get('/assets/app-1a2b.js').expect(200);
    expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    const icon = await app.visitor().get('/icon.svg').expect(200);
    expect(icon.headers['cache-control']).toBe('public, max-age=0');
  });

  it('sends the tighter twin to a browser that takes both, unless it says no', async () => {
    const encodingFor = async (accepted: string) => {
      const headers = { 'Accept-Encoding': accepted };
      const res = await fetch(`${app.url}/assets/packed-3c4d.js`, { headers });
      expect(await res.text()).toBe('export const long = 1;');
      return res.headers.get('content-encoding');
    };
    expect(await encodingFor('gzip, deflate, br')).toBe('br');
    expect(await encodingFor('br;q=0, gzip;q=0.5')).toBe('gzip');
  });

  it('sends the packed twin of a file to a browser that takes it, and the file itself to one that does not', async () => {
    const packed = await app
      .visitor()
      .get('/assets/packed-3c4d.js')
      .set('Accept-Encoding', 'gzip')
      .expect(200);
    expect(packed.headers).toMatchObject({
      'content-encoding': 'gzip',
      'content-type': expect.stringContaining('javascript'),
      'cache-control': 'public, max-age=31536000, immutable',
      vary: expect.stringContaining('Accept-Encoding'),
    });
    const plain = await app
      .visitor()
      .get('/assets/packed-3c4d.js')
      .set('Accept-Encoding', 'identity')
      .expect(200);
    expect(plain.headers['content-encoding']).toBeUndefined();
    for (const { text } of [packed, plain]) expect(text).toBe('export const long = 1;');
  });

  it('says 404 for a hashed file that is gone, not the page', async () => {
    expectProblem(await app.visitor().get('/assets/app-0000.js'), 'not_found');
    expectProblem(await app.visitor().get('/assets/../../package.json'), 'not_found');
  });

  it('lets the page’s own script run by its hash, programmes of WebAssembly, and no other inline script', async () => {
    const policy = (await app.visitor().get('/')).headers['content-security-policy'] ?? '';
    const scripts = policy.split(';').find((directive) => directive.startsWith('script-src'));
    const hash = createHash('sha256').update(SCRIPT).digest('base64');
    expect(scripts).toBe(`script-src 'self' 'wasm-unsafe-eval' 'sha256-${hash}'`);
    expect(policy).toContain("frame-ancestors 'none'");
  });
});

describe('a client that has not been built', () => {
  const app = useApp({ clientDir: join(folder, 'nothing') });

  it('is told in words, with 503, while the API answers', async () => {
    const res = await app.visitor().get('/').expect(503);
    expect(res.text).toBe('The pages have not been built yet. Run the build and start again.');
    await app.visitor().get('/api/health').expect(200);
  });
});

describe('the hashes of scripts', () => {
  it('are of the scripts whose text stands in the page, whatever their attributes', () => {
    const page = '<SCRIPT nonce="x">a()</SCRIPT>\n<script\n src="/b.js"></script><script>c()\n</script >';
    const hash = (text: string) => `sha256-${createHash('sha256').update(text).digest('base64')}`;
    expect(inlineScriptHashes(page)).toEqual([hash('a()'), hash('c()\n')]);
  });
});
