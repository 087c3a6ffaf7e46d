import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Kept on the device from the start: scripts, styles, letters and the page itself; the solver only once it was used. */
const KEPT = /\.(js|css|woff2|html|webmanifest|png|svg)$/;
/** Files whose name carries their content need no revision beside it. */
const HASHED = /^assets\//;

/** What the service worker keeps, with the revision of what keeps its name.
 * @param {string} folder */
export function builtFiles(folder) {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((file) => file.isFile() && KEPT.test(file.name) && file.name !== 'service-worker.js')
    .map((file) =>
      join(file.parentPath, file.name)
        .slice(folder.length + 1)
        .replaceAll('\\', '/'),
    )
    .sort()
    .map((name) => ({ url: `/${name}`, revision: HASHED.test(name) ? null : hashOf(join(folder, name)) }));
}

/** @param {string} file */
const hashOf = (file) => createHash('sha256').update(readFileSync(file)).digest('hex').slice(0, 16);

/** Builds the service worker once everything that it keeps is there.
 * @param {import('./offline-build.d.mts').Build} build the bundler’s own, which these scripts do not import */
export function offlineBuild(build) {
  let folder = '';
  return {
    name: 'featherbeam-offline',
    apply: /** @type {const} */ ('build'),
    /** @param {{ dir?: string | undefined }} options */
    writeBundle({ dir = '' }) {
      folder = dir;
    },
    async closeBundle() {
      await build({
        configFile: false,
        publicDir: false,
        logLevel: 'warn',
        define: {
          __BUILT_FILES__: JSON.stringify(builtFiles(folder)),
          'process.env.NODE_ENV': '"production"',
        },
        build: {
          outDir: folder,
          emptyOutDir: false,
          target: 'es2022',
          rollupOptions: {
            input: 'client/offline/service-worker.ts',
            output: { entryFileNames: 'service-worker.js', format: 'iife' },
          },
        },
      });
    },
  };
}
