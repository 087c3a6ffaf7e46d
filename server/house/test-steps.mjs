import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureClient } from './client-build.mjs';
import { ensureChromium, ensurePostgres } from './debian.mjs';
import { explain, HouseError, say } from './messages.mjs';
import { ensurePackages } from './packages.mjs';
import { root } from './paths.mjs';
import { run } from './run.mjs';
import { countReport } from './test-report.mjs';

/** @typedef {import('./test-report.d.mts').Count} Count */

const bin = (/** @type {string} */ name) => join(root, 'node_modules', '.bin', name);
const node = process.execPath;

/** Checks that are one pass or one failure each. @type {Record<string, () => Promise<{ code: number, output: string }>>} */
const CHECKS = {
  format: () => run(bin('prettier'), ['--check', '--log-level', 'warn', '.']),
  lint: () => run('npm', ['run', '--silent', 'lint']),
  types: () => run('npm', ['run', '--silent', 'typecheck']),
  build: async () => ensureClient().then(() => ({ code: 0, output: '' }), failure),
};
const SUITES = ['unit', 'api', 'e2e'];
const STEPS = [...Object.keys(CHECKS), ...SUITES];

/** @param {unknown} error */
const failure = (error) => ({ code: 1, output: error instanceof HouseError ? error.message : String(error) });

/** Tests have their own database, port and home; nothing of the caller's reaches them. @returns {NodeJS.ProcessEnv} */
export function ownEnv() {
  const settings = /^(DATABASE_URL|PORT|HOST|API_PORT|NODE_ENV|LOG_LEVEL|FEATHERBEAM_.*)$/;
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !settings.test(name)));
}

/** Which steps to take, and what to hand on to vitest. @param {string[]} args */
export function chosen(args) {
  const first = args.findIndex((arg) => !STEPS.includes(arg));
  const names = first < 0 ? args : args.slice(0, first);
  return { names: names.length === 0 ? STEPS : names, rest: first < 0 ? [] : args.slice(first) };
}

/** @param {string[]} names */
export async function prepare(names) {
  await ensurePackages();
  if (names.includes('api') || names.includes('e2e')) await ensurePostgres();
  if (!names.includes('e2e')) return;
  await ensureChromium();
  if (!names.includes('build')) await ensureClient();
}

/** @param {string} name @param {string[]} rest @returns {Promise<Count>} */
export const take = (name, rest) => (SUITES.includes(name) ? suite(name, rest) : check(name));

/** @param {string} name */
async function check(name) {
  const { code, output } = (await CHECKS[name]?.()) ?? { code: 1, output: `There is no check ${name}.` };
  say(code === 0 ? `✓ ${name}` : `✗ ${name}\n${explain(output) ?? output.trimEnd()}`);
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** @param {string} name @param {string[]} rest */
async function suite(name, rest) {
  const folder = mkdtempSync(join(tmpdir(), 'featherbeam-report-'));
  try {
    const file = join(folder, 'report.json');
    const reports = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
    const args = [
      join(root, 'node_modules', 'vitest', 'vitest.mjs'),
      'run',
      '--project',
      name,
      ...reports,
      ...rest,
    ];
    const { code } = await run(node, args, { env: ownEnv(), show: true });
    return countReport(existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null, code);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
