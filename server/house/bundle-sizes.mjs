import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';

/** @typedef {import('./bundle-sizes.d.mts').BuiltChunk} BuiltChunk */

/** What a page may take before it is usable, kB (1,000 bytes) of JavaScript, gzip. */
export const BUDGETS = [
  { page: 'sign-in', budget: 130, modules: ['/client/app/pages/sign-in-page.tsx'] },
  {
    page: 'a glider’s Balance',
    budget: 300,
    modules: ['/client/app/pages/glider/glider-layout.tsx', '/client/app/pages/glider/balance-page.tsx'],
  },
];

/** Where a build leaves its sizes, in its own folder; a name with a point before it is not served. */
export const SIZES = join('.vite', 'sizes.json');

/** Text that is worth packing before it is sent. */
const PACKED = /\.(js|css|svg|json)$/;

/** How much JavaScript each page with a budget needs: the entry, its own files, and all that they import.
 * @param {readonly BuiltChunk[]} chunks */
export function pageSizes(chunks) {
  const byName = new Map(chunks.map((chunk) => [chunk.fileName, chunk]));
  return BUDGETS.map(({ page, budget, modules }) => {
    const roots = chunks.filter(
      ({ isEntry, facadeModuleId }) => isEntry || modules.some((module) => facadeModuleId?.endsWith(module)),
    );
    if (roots.length <= modules.length) throw new Error(`${page}: a file of this page was not built`);
    /** @type {Set<string>} */
    const needed = new Set();
    /** @param {string} name */
    const need = (name) => {
      if (needed.has(name)) return;
      needed.add(name);
      byName.get(name)?.imports?.forEach(need);
    };
    roots.forEach(({ fileName }) => need(fileName));
    const bytes = [...needed].reduce((sum, name) => sum + packedSize(byName.get(name)), 0);
    return { page, size: bytes / 1000, budget };
  });
}

/** @param {BuiltChunk | undefined} chunk */
const packedSize = (chunk) => (chunk?.code === undefined ? 0 : gzipSync(chunk.code, { level: 9 }).length);

/** Tells and keeps the sizes at the end of a build, and lays packed twins beside each text file. */
export function bundleSizes() {
  return {
    name: 'featherbeam-bundle-sizes',
    apply: /** @type {const} */ ('build'),
    /** @param {{ dir?: string }} options @param {Record<string, BuiltChunk>} bundle */
    writeBundle({ dir = '' }, bundle) {
      const sizes = pageSizes(Object.values(bundle));
      for (const { page, size, budget } of sizes) {
        console.log(`JavaScript before ${page} is usable: ${size.toFixed(1)} of ${budget} kB (gzip)`);
      }
      mkdirSync(join(dir, '.vite'), { recursive: true });
      writeFileSync(join(dir, SIZES), JSON.stringify(sizes, null, 2));
      for (const { fileName } of Object.values(bundle)) {
        if (!PACKED.test(fileName)) continue;
        const file = join(dir, fileName);
        const text = readFileSync(file);
        writeFileSync(`${file}.gz`, gzipSync(text, { level: 9 }));
        writeFileSync(`${file}.br`, brotliCompressSync(text));
      }
    },
  };
}
