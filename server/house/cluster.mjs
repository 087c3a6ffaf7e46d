import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import {
  clusterFolder,
  databaseUrl,
  initialise,
  makeHome,
  passwordsOf,
  versionOf,
} from './cluster-files.mjs';
import { freePort } from './machine.mjs';
import { explain, HouseError } from './messages.mjs';
import { findPostgres, OLDEST_POSTGRES, plainEnv, postgresAccount } from './postgres.mjs';
import { keepWatch, launch, stopServer } from './postmaster.mjs';
import { run, tail } from './run.mjs';

export { findPostgres };

/** @typedef {import('./cluster.d.mts').Cluster} Cluster */

/** @type {typeof import('./cluster.d.mts').startCluster} */
export async function startCluster({ home, throwaway = false }) {
  if (!home && !throwaway) throw new HouseError('A cluster that is kept needs a home.');
  const account = postgresAccount();
  const place = home ?? mkdtempSync(join(tmpdir(), 'featherbeam-'));
  makeHome(place);
  const folder = clusterFolder(place, account);
  const postgres = requirePostgres(versionOf(folder), folder);
  const passwords = passwordsOf(folder);
  await initialise({ folder, postgres, account, throwaway, password: passwords.superuser });

  const made = throwaway ? [folder, ...(home ? [] : [place])] : [];
  const server = { folder, postgres, account, throwaway };
  const watch = keepWatch(folder, made);
  try {
    const port = await launch(server, freePort);
    await makeOwnDatabase(postgres, port, passwords);
    /** @type {Promise<void> | undefined} */
    let stopped;
    const stop = async () => {
      await stopServer(server);
      watch.dismiss();
      for (const path of made) rmSync(path, { recursive: true, force: true });
    };
    return {
      port,
      url: (database) => databaseUrl(port, passwords.featherbeam, database),
      stop: () => (stopped ??= stop()),
    };
  } catch (error) {
    await stopServer(server);
    watch.dismiss();
    throw error;
  }
}

/** @param {number | null} major of the data there are @param {string} folder */
function requirePostgres(major, folder) {
  const postgres = findPostgres(major ?? undefined);
  if (postgres) return postgres;
  if (major && findPostgres()) {
    throw new HouseError(
      `The database in ${folder} was made by PostgreSQL ${major}, which is not installed: install postgresql-${major}, ` +
        'or move that folder away and restore a backup.',
    );
  }
  throw new HouseError(
    `PostgreSQL ${major ?? OLDEST_POSTGRES} or newer is missing: install it (on Debian: apt-get install postgresql) and start again.`,
  );
}

/**
 * The role and database that the product uses; done at every start, so that a first start broken off is mended.
 * @param {import('./cluster.d.mts').Postgres} postgres
 * @param {number} port
 * @param {import('./cluster-files.mjs').Passwords} passwords
 */
async function makeOwnDatabase(postgres, port, passwords) {
  const missing = (/** @type {string} */ kind, /** @type {string} */ rest) =>
    `SELECT 'CREATE ${rest}' WHERE NOT EXISTS (SELECT FROM ${kind} = 'featherbeam') \\gexec\n`;
  const script =
    missing('pg_roles WHERE rolname', 'ROLE featherbeam LOGIN CREATEDB') +
    `ALTER ROLE featherbeam PASSWORD '${passwords.featherbeam}';\n` +
    missing('pg_database WHERE datname', 'DATABASE featherbeam OWNER featherbeam');
  const args = [
    '-X',
    '-q',
    '-v',
    'ON_ERROR_STOP=1',
    '-h',
    '127.0.0.1',
    '-p',
    String(port),
    '-U',
    'postgres',
    '-d',
    'postgres',
  ];
  const env = plainEnv({ PGPASSWORD: passwords.superuser });
  const { code, output } = await run(join(postgres.bin, 'psql'), args, { env, input: script });
  if (code !== 0)
    throw new HouseError(explain(output) ?? `The database could not be prepared:\n${tail(output)}`);
}
