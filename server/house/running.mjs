import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { makeHome } from './cluster-files.mjs';
import { HouseError } from './messages.mjs';

/** @typedef {{ pid: number, born: string, address: string, databasePort?: number, leaving?: boolean }} Running */

const note = (/** @type {string} */ home) => join(home, 'running.json');

/** When a process began, so that a number used again is not taken for it. @param {number} pid */
function bornOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? '';
  } catch {
    return '';
  }
}

/** The house that uses this home now, or null. @param {string} home @returns {Running | null} */
export function runningIn(home) {
  if (!existsSync(note(home))) return null;
  try {
    const running = /** @type {Running} */ (JSON.parse(readFileSync(note(home), 'utf8')));
    return running.born !== '' && bornOf(running.pid) === running.born ? running : null;
  } catch {
    return null;
  }
}

/**
 * Takes the home for this process; two houses on one cluster would stop it under each other.
 * @param {string} home
 * @param {string} address what the house will serve, for the sentence that the other one gets
 */
export async function claim(home, address) {
  const isLeftOver = existsSync(note(home));
  let other = runningIn(home);
  for (let wait = 0; other?.leaving && wait < 100; wait += 1) {
    await pause(100);
    other = runningIn(home);
  }
  if (other) {
    throw new HouseError(
      `Featherbeam already runs from ${home} (${other.address}, process ${other.pid}): stop it first, ` +
        'or give this one a folder of its own with FEATHERBEAM_HOME.',
    );
  }
  makeHome(home);
  /** @type {Running} */
  const own = { pid: process.pid, born: bornOf(process.pid), address };
  if (isLeftOver) rmSync(note(home), { force: true });
  try {
    write(home, own, 'wx');
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    throw new HouseError(`Featherbeam is being started from ${home} by another command at this moment.`);
  }
  return {
    /** Lets backups find the database. @param {number} databasePort */
    tellPort: (databasePort) => write(home, { ...own, databasePort }, 'w'),
    /** Lets the next start wait for this one's end instead of refusing. */
    leave: () => write(home, { ...own, leaving: true }, 'w'),
    release: () => rmSync(note(home), { force: true }),
  };
}

/** @param {string} home @param {Running} running @param {'w' | 'wx'} flag */
const write = (home, running, flag) =>
  writeFileSync(note(home), JSON.stringify(running), { flag, mode: 0o600 });
