import { execFileSync } from 'node:child_process';
import { existsSync, readdirSync, realpathSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { HouseError } from './messages.mjs';
import { isRoot } from './paths.mjs';

export const OLDEST_POSTGRES = 15;
const PROGRAMS = ['initdb', 'pg_ctl', 'postgres', 'psql'];

/** @param {string} parent @param {RegExp} name */
const foldersIn = (parent, name) =>
  existsSync(parent)
    ? readdirSync(parent)
        .filter((entry) => name.test(entry))
        .map((entry) => join(parent, entry, 'bin'))
    : [];

function* candidates() {
  yield* foldersIn('/usr/lib/postgresql', /^\d+$/);
  yield* foldersIn('/usr', /^pgsql-\d+$/);
  for (const folder of (process.env.PATH ?? '').split(delimiter)) {
    const program = join(folder, 'postgres');
    if (folder && existsSync(program)) yield dirname(realpathSync(program));
  }
}

/** @param {string} bin */
function majorOf(bin) {
  try {
    const version = execFileSync(join(bin, 'postgres'), ['--version'], { encoding: 'utf8' });
    return Number(/\) (\d+)/.exec(version)?.[1] ?? 0);
  } catch {
    return 0;
  }
}

/** @type {typeof import('./cluster.d.mts').findPostgres} */
export function findPostgres(major) {
  const found = [...new Set(candidates())]
    .filter((bin) => PROGRAMS.every((program) => existsSync(join(bin, program))))
    .map((bin) => ({ bin, major: majorOf(bin) }))
    .filter((one) => (major ? one.major === major : one.major >= OLDEST_POSTGRES));
  return found.sort((a, b) => b.major - a.major)[0] ?? null;
}

/**
 * Whom PostgreSQL runs as: it refuses to run as root.
 * @returns {{ uid?: number, gid?: number }}
 */
export function postgresAccount() {
  if (!isRoot) return {};
  try {
    const id = (/** @type {string} */ flag) =>
      Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8', stdio: 'pipe' }));
    return { uid: id('-u'), gid: id('-g') };
  } catch {
    throw new HouseError(
      'PostgreSQL refuses to run as root and there is no user “postgres”: add one with “adduser --system --group postgres”.',
    );
  }
}

/**
 * An environment in which PostgreSQL's programs hear only what they are told here, not the caller's PG variables.
 * @param {Record<string, string>} [more]
 */
export function plainEnv(more = {}) {
  const kept = Object.entries(process.env).filter(([key]) => !/^(PG|LC_|LANG)/.test(key));
  return { ...Object.fromEntries(kept), LC_ALL: 'C.UTF-8', ...more };
}
