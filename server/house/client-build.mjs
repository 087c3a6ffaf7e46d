import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { explain, HouseError, say } from './messages.mjs';
import { cache, root } from './paths.mjs';
import { run, tail } from './run.mjs';

const SOURCES = [
  'client',
  'shared',
  'data',
  'index.html',
  'vite.config.ts',
  'tailwind.config.ts',
  'package-lock.json',
];
const built = join(cache, 'client');
const stamp = join(cache, 'client.sha256');

/** @param {string} path @returns {string[]} */
function filesUnder(path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  const entries = readdirSync(full, { withFileTypes: true, recursive: true });
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => relative(root, join(entry.parentPath, entry.name)));
}

function sourceHash() {
  const hash = createHash('sha256');
  for (const source of SOURCES) {
    const files = source.includes('.')
      ? [source].filter((file) => existsSync(join(root, file)))
      : filesUnder(source);
    for (const file of files.sort())
      hash
        .update(`${file}\0`)
        .update(readFileSync(join(root, file)))
        .update('\0');
  }
  return hash.digest('hex');
}

/**
 * Builds the client if its sources have changed: beside the old one and then swapped, so that a server
 * that serves the old one meanwhile is not left without files.
 */
export async function ensureClient() {
  const hash = sourceHash();
  if (existsSync(join(built, 'index.html')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === hash)
    return;
  say('Building the client …');
  const [next, old] = [`${built}.next-${process.pid}`, `${built}.old-${process.pid}`];
  try {
    const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
    const args = [vite, 'build', '--outDir', next, '--emptyOutDir', '--logLevel', 'warn'];
    const { code, output } = await run(process.execPath, args, {
      env: { ...process.env, NODE_ENV: 'production' },
    });
    if (code !== 0)
      throw new HouseError(explain(output) ?? `The client could not be built:\n${tail(output, 30)}`);
    mkdirSync(dirname(built), { recursive: true });
    if (existsSync(built)) renameSync(built, old);
    renameSync(next, built);
    writeFileSync(stamp, hash);
  } finally {
    for (const folder of [next, old]) rmSync(folder, { recursive: true, force: true });
  }
}
