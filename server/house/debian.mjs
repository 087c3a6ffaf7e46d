import { existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { explain, HouseError, say } from './messages.mjs';
import { isRoot } from './paths.mjs';
import { findPostgres, OLDEST_POSTGRES } from './postgres.mjs';
import { run, tail } from './run.mjs';

const CHROMIUM = '/usr/bin/chromium';
const NO_CLUSTER = '/etc/postgresql-common/createcluster.d/featherbeam.conf';

/** @param {string} name of the package @param {string} what it is, for the reader */
async function install(name, what) {
  if (!isRoot)
    throw new HouseError(
      `${what} is missing: install it with “sudo apt-get install ${name}” and start again.`,
    );
  if (!existsSync('/usr/bin/apt-get'))
    throw new HouseError(`${what} is missing and this is no Debian: install it and start again.`);
  say(`Installing Debian’s package ${name} …`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update'], { env });
  const { code, output } = await run('apt-get', ['install', '-y', '--no-install-recommends', name], { env });
  if (code !== 0)
    throw new HouseError(
      explain(output, 'debian') ?? `Debian’s package ${name} could not be installed:\n${tail(output)}`,
    );
}

/** PostgreSQL's programs; a cluster of Debian's own is not wanted, so none is made while they are installed. */
export async function ensurePostgres() {
  if (findPostgres()) return;
  if (isRoot) {
    mkdirSync(dirname(NO_CLUSTER), { recursive: true });
    writeFileSync(NO_CLUSTER, 'create_main_cluster = false\n');
  }
  try {
    await install('postgresql', `PostgreSQL ${OLDEST_POSTGRES} or newer`);
  } finally {
    if (isRoot) rmSync(NO_CLUSTER, { force: true });
  }
  if (!findPostgres())
    throw new HouseError(`PostgreSQL ${OLDEST_POSTGRES} or newer is needed; Debian’s package here is older.`);
}

export async function ensureChromium() {
  if (!existsSync(CHROMIUM)) await install('chromium', 'Chromium, in which the pages are tested,');
}
