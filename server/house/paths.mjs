import { createHash } from 'node:crypto';
import { realpathSync } from 'node:fs';
import { homedir } from 'node:os';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The work tree. */
export const root = realpathSync(fileURLToPath(new URL('../..', import.meta.url)));

/** Whatever can be made again from the work tree. */
export const cache = join(root, 'node_modules', '.cache', 'featherbeam');

export const isRoot = process.getuid?.() === 0;

/** @type {typeof import('./paths.d.mts').homeFor} */
export function homeFor({ env, clone, asRoot, userHome }) {
  if (env.FEATHERBEAM_HOME) return resolve(clone, env.FEATHERBEAM_HOME);
  const mark = createHash('sha256').update(clone).digest('hex').slice(0, 8);
  // root's own folder is closed to the user that PostgreSQL must run as.
  if (asRoot) return join('/var/lib/featherbeam', mark);
  return join(env.XDG_DATA_HOME || join(userHome, '.local', 'share'), `featherbeam-${mark}`);
}

/** The folder of the kept cluster and stored files of this clone. */
export const home = homeFor({ env: process.env, clone: root, asRoot: isRoot, userHome: homedir() });

/** A path as the caller of `npm run` meant it: npm itself changes to the work tree. @param {string} path */
export const fromCaller = (path) => resolve(process.env.INIT_CWD ?? process.cwd(), path);
