import { join } from 'node:path';
import { databaseUrl, clusterFolder, passwordsOf, versionOf } from './cluster-files.mjs';
import { startCluster } from './cluster.mjs';
import { ensurePostgres } from './debian.mjs';
import { atEnd } from './life.mjs';
import { HouseError } from './messages.mjs';
import { home } from './paths.mjs';
import { findPostgres, postgresAccount } from './postgres.mjs';
import { claim, runningIn } from './running.mjs';

/**
 * The database for a command besides the server: the one given, that of a running house, or our own
 * cluster started for as long as the command runs.
 * @param {{ alone?: boolean }} [options] alone: refuse while a house is running
 * @returns {Promise<string>} its address
 */
export async function openDatabase({ alone = false } = {}) {
  if (process.env.DATABASE_URL) return process.env.DATABASE_URL;
  const running = runningIn(home);
  if (running && alone) throw new HouseError(`Featherbeam is running (${running.address}): stop it first.`);
  if (running) {
    if (!running.databasePort)
      throw new HouseError('Featherbeam is just being started: wait until it answers.');
    return databaseUrl(running.databasePort, passwordsOf(clusterFolder(home, postgresAccount())).featherbeam);
  }
  const own = await claim(home, 'a command on its database');
  atEnd(own.release);
  await ensurePostgres();
  const cluster = await startCluster({ home });
  atEnd(cluster.stop);
  own.tellPort(cluster.port);
  return cluster.url();
}

/** A client program of PostgreSQL, of the version that made our cluster where there is one. @param {string} name */
export function clientProgram(name) {
  const ours = process.env.DATABASE_URL ? null : versionOf(clusterFolder(home, postgresAccount()));
  const found = findPostgres(ours ?? undefined);
  if (!found) throw new HouseError(`PostgreSQL’s program ${name} is missing: install postgresql-client.`);
  return join(found.bin, name);
}
