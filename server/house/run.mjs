import { spawn } from 'node:child_process';
import { root } from './paths.mjs';

/** Programs still running. @type {Set<import('node:child_process').ChildProcess>} */
const children = new Set();

/**
 * @typedef {object} RunOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env] the whole environment, not an addition
 * @property {{ uid?: number, gid?: number }} [account] whom to run as
 * @property {string} [input] what the program reads
 * @property {boolean} [show] let it write to the terminal instead of collecting its output
 */

/**
 * Runs a program to its end and answers with its exit code and what it wrote; a missing program is code 127.
 * @param {string} program
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<{ code: number, output: string }>}
 */
export function run(
  program,
  args,
  { cwd = root, env = process.env, account = {}, input, show = false } = {},
) {
  return new Promise((done) => {
    const out = show ? 'inherit' : 'pipe';
    const child = spawn(program, args, {
      cwd,
      env,
      ...account,
      stdio: [input === undefined ? 'ignore' : 'pipe', out, out],
    });
    children.add(child);
    let output = '';
    const collect = (/** @type {Buffer} */ chunk) => (output += chunk);
    child.stdout?.on('data', collect);
    child.stderr?.on('data', collect);
    child.stdin?.on('error', () => {});
    child.stdin?.end(input);
    child.on('error', (error) => {
      children.delete(child);
      done({ code: 127, output: String(error) });
    });
    child.on('close', (code) => {
      children.delete(child);
      done({ code: code ?? 1, output });
    });
  });
}

/**
 * The last lines of a program's output: enough to see the cause.
 * @param {string} output
 * @param {number} [lines]
 */
export const tail = (output, lines = 15) => output.trimEnd().split('\n').slice(-lines).join('\n');

/** Ends every program that still runs, by force where asking does not help: npm goes on installing otherwise. */
export async function endChildren() {
  const running = [...children].filter((child) => child.exitCode === null && child.signalCode === null);
  const ended = running.map(
    (child) =>
      new Promise((done) => {
        child.once('exit', done);
        child.kill('SIGTERM');
        setTimeout(() => child.kill('SIGKILL'), 4000).unref();
      }),
  );
  await Promise.all(ended);
}
