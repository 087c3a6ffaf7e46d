import { spawn } from 'node:child_process';
import { existsSync, readFileSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { dataOf } from './cluster-files.mjs';
import { explain, HouseError } from './messages.mjs';
import { plainEnv } from './postgres.mjs';
import { run, tail } from './run.mjs';

/** @typedef {{ folder: string, postgres: import('./cluster.d.mts').Postgres, account: { uid?: number, gid?: number }, throwaway: boolean }} Server */

const pidFile = (/** @type {string} */ folder) => join(dataOf(folder), 'postmaster.pid');
const logFile = (/** @type {string} */ folder) => join(folder, 'postgres.log');

/** @param {Server} server @param {string[]} args */
const pgCtl = ({ folder, postgres, account }, args) =>
  run(join(postgres.bin, 'pg_ctl'), ['-D', dataOf(folder), '-w', ...args], {
    cwd: folder,
    env: plainEnv(),
    account,
  });

/** @param {Server} server */
export async function stopServer(server) {
  if (!existsSync(pidFile(server.folder))) return;
  const { code, output } = await pgCtl(server, [
    'stop',
    '-t',
    '60',
    '-m',
    server.throwaway ? 'immediate' : 'fast',
  ]);
  if (code !== 0 && existsSync(pidFile(server.folder)) && isOurs(server.folder)) {
    throw new HouseError(`PostgreSQL did not stop: ${tail(output, 1)}`);
  }
}

/** Whether the process named in the pid file is a PostgreSQL on this very folder, not a newcomer with an old number. @param {string} folder */
function isOurs(folder) {
  const pid = readFileSync(pidFile(folder), 'utf8').split('\n')[0];
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(dataOf(folder));
  } catch {
    return false;
  }
}

/** What an earlier run left: a server without a master is stopped, a pid file without a server removed. @param {Server} server */
async function clearAway(server) {
  if (!existsSync(pidFile(server.folder))) return;
  if (isOurs(server.folder)) await stopServer(server);
  else if (existsSync('/proc/self')) rmSync(pidFile(server.folder), { force: true });
}

/**
 * Starts PostgreSQL and answers with its port once it accepts connections.
 * @param {Server} server
 * @param {() => Promise<number>} choosePort
 */
export async function launch(server, choosePort) {
  const log = logFile(server.folder);
  for (let attempt = 1; ; attempt += 1) {
    await clearAway(server);
    if (existsSync(log)) renameSync(log, `${log}.previous`);
    const port = await choosePort();
    const { code, output } = await pgCtl(server, [
      'start',
      '-t',
      '120',
      '-l',
      log,
      '-o',
      settings(port, server.throwaway),
    ]);
    if (code === 0) return port;
    const said = existsSync(log) ? readFileSync(log, 'utf8') : output;
    // Backends of a killed server need a moment to notice; the port may have been taken since it was free.
    const passing = /shared memory block|could not bind|Address already in use/.test(said);
    if (!passing || attempt === 5)
      throw new HouseError(explain(said) ?? `PostgreSQL did not start (${log}):\n${tail(said)}`);
    await pause(500);
  }
}

/** @param {number} port @param {boolean} throwaway */
function settings(port, throwaway) {
  const always = [
    'listen_addresses=127.0.0.1',
    "unix_socket_directories=''",
    'timezone=UTC',
    'log_timezone=UTC',
  ];
  const careless = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off'];
  return [`-p ${port}`, ...[...always, ...(throwaway ? careless : [])].map((one) => `-c ${one}`)].join(' ');
}

// Waits for a line that says all is well; if its writer dies without one, stops the server and tidies up.
const WATCH = `
read -r word && exit 0
file=$1; shift
pid=$(head -n 1 "$file" 2>/dev/null)
[ -z "$pid" ] || kill -INT "$pid"
[ $# -gt 0 ] || exit 0
i=0; while [ -e "$file" ] && [ $i -lt 100 ]; do sleep 0.1; i=$((i+1)); done
rm -rf "$@"`;

/**
 * A little process that outlives this one: even after kill -9 no server is left behind.
 * @param {string} folder
 * @param {string[]} made what to delete then
 */
export function keepWatch(folder, made) {
  const watch = spawn('sh', ['-c', WATCH, 'featherbeam-watch', pidFile(folder), ...made], {
    cwd: '/',
    detached: true,
    stdio: ['pipe', 'ignore', 'ignore'],
  });
  watch.on('error', () => {});
  watch.stdin.on('error', () => {});
  watch.unref();
  return { dismiss: () => void watch.stdin.end('done\n') };
}
