import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { explain, HouseError, say } from './messages.mjs';
import { cache, root } from './paths.mjs';
import { run, tail } from './run.mjs';

const lock = join(root, 'package-lock.json');
const stamp = join(cache, 'packages.sha256');
const lockHash = () => createHash('sha256').update(readFileSync(lock)).digest('hex');

/** Whether what is installed is what the lock file names, and is there: two installations at once destroy each other. */
export function packagesAreCurrent() {
  const installed = join(root, 'node_modules', '.package-lock.json');
  if (!existsSync(installed)) return false;
  const folders = Object.keys(JSON.parse(readFileSync(installed, 'utf8')).packages ?? {});
  if (!folders.every((folder) => existsSync(join(root, folder, 'package.json')))) return false;
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lockHash()) return true;
  return statSync(installed).mtimeMs >= statSync(lock).mtimeMs;
}

/** Packages as the lock file has them, development tools included: the client is built here. */
export async function ensurePackages() {
  if (!packagesAreCurrent()) {
    say('Installing packages (only when the lock file has changed; about half a minute) …');
    const npm = process.env.npm_execpath;
    const [program, ...first] = npm?.endsWith('.js') ? [process.execPath, npm] : ['npm'];
    const options = ['--include=dev', '--prefer-offline', '--loglevel=error', '--no-progress'];
    const patience = ['--fetch-retries=2', '--fetch-retry-mintimeout=1000', '--fetch-retry-maxtimeout=5000'];
    const { code, output } = await run(program, [...first, 'ci', ...options, ...patience]);
    if (code === 127)
      throw new HouseError('npm was not found: it comes with Node; install it and start again.');
    if (code !== 0)
      throw new HouseError(
        explain(output, 'packages') ?? `npm could not install the packages:\n${tail(output)}`,
      );
  }
  mkdirSync(dirname(stamp), { recursive: true });
  writeFileSync(stamp, lockHash());
}
