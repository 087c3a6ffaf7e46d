import { execFile } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';
import { pageSizes, SIZES, type BuiltChunk, type PageSize } from '#server/house/bundle-sizes.mjs';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));

const chunk = (fileName: string, code: string, more: Partial<BuiltChunk> = {}): BuiltChunk => ({
  type: 'chunk',
  fileName,
  code,
  imports: [],
  ...more,
});
const PAGES = '/w/client/app/pages';

describe('the size of a page', () => {
  const sized = (chunks: readonly BuiltChunk[]) =>
    pageSizes([
      chunk('entry.js', 'a', { isEntry: true, imports: ['shared.js'] }),
      chunk('shared.js', 'b'),
      chunk('sign-in.js', 'c', { facadeModuleId: `${PAGES}/sign-in-page.tsx` }),
      chunk('layout.js', 'd', { facadeModuleId: `${PAGES}/glider/glider-layout.tsx` }),
      ...chunks,
    ]);
  const balance = (more: Partial<BuiltChunk>) =>
    chunk('balance.js', 'e', { facadeModuleId: `${PAGES}/glider/balance-page.tsx`, ...more });

  it('counts each file that it needs once, and none that is fetched later', () => {
    const [alone] = sized([balance({})]);
    const [, first] = sized([balance({})]);
    const [, second] = sized([
      balance({ imports: ['shared.js', 'only.js'] }),
      chunk('only.js', 'f'),
      chunk('later.js', 'g'),
    ]);
    // Every text here is one letter, so every file packs to the same size.
    const one = (alone?.size ?? 0) / 3;
    expect(first?.size).toBeCloseTo(4 * one, 9);
    expect(second?.size).toBeCloseTo(5 * one, 9);
  });

  it('is not told without the page, an entry, or a file that it needs', () => {
    expect(() => sized([])).toThrow(/Balance: .*balance-page.tsx has no file of its own/);
    expect(() => sized([balance({ imports: ['gone.js'] })])).toThrow(/gone.js is needed and was not built/);
    expect(() => pageSizes([])).toThrow(/no entry/);
    // A second entry, as of a worker, does not stand for a page that is missing.
    expect(() => sized([chunk('worker.js', 'w', { isEntry: true })])).toThrow(/has no file of its own/);
  });
});

describe('the built client', () => {
  it('keeps each page within the JavaScript that it may take before it is usable', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'featherbeam-bundle-'));
    try {
      const vite = join(ROOT, 'node_modules', 'vite', 'bin', 'vite.js');
      const args = [vite, 'build', '--outDir', folder, '--logLevel', 'error'];
      await promisify(execFile)(process.execPath, args, {
        cwd: ROOT,
        env: { ...process.env, NODE_ENV: 'production' },
      });
      const sizes = JSON.parse(readFileSync(join(folder, SIZES), 'utf8')) as PageSize[];
      expect(sizes.map(({ page }) => page)).toEqual(['sign-in', 'a glider’s Balance']);
      for (const { page, size, budget } of sizes) {
        expect(size, `kB before ${page} is usable`).toBeLessThanOrEqual(budget);
        // Less than the framework alone comes to would mean that something was not counted.
        expect(size, `kB before ${page} is usable`).toBeGreaterThan(60);
      }
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  }, 120_000);
});
