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

/** What is worth packing before it is sent. */
const PACKED = /\.(js|css|svg|json|wasm)$/;

/** How much JavaScript each page with a budget needs: the entry, its own files, and all that they import.
 * @param {readonly BuiltChunk[]} chunks */
export function pageSizes(chunks) {
  const byName = new Map(chunks.map((chunk) => [chunk.fileName, chunk]));
  return BUDGETS.map(({ page, budget, modules }) => {
    const entries = chunks.filter(({ isEntry }) => isEntry);
    if (entries.length === 0) throw new Error('the build has no entry');
    const own = modules.map((module) => {
      const found = chunks.find(({ facadeModuleId }) => facadeModuleId?.endsWith(module));
      if (!found) throw new Error(`${page}: ${module} has no file of its own in the build`);
      return found;
    });
    /** @type {Set<string>} */
    const needed = new Set();
    /** @param {string} name */
    const need = (name) => {
      if (needed.has(name)) return;
      needed.add(name);
      byName.get(name)?.imports?.forEach(need);
    };
    [...entries, ...own].forEach(({ fileName }) => need(fileName));
    const bytes = [...needed].reduce((sum, name) => sum + packedSize(page, byName.get(name), name), 0);
    return { page, size: bytes / 1000, budget };
  });
}

/** A file that is needed and not there would count as nothing.
 * @param {string} page @param {BuiltChunk | undefined} chunk @param {string} name */
function packedSize(page, chunk, name) {
  if (chunk?.code === undefined) throw new Error(`${page}: ${name} is needed and was not built`);
  return gzipSync(chunk.code, { level: 9 }).length;
}

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
