import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { root } from './paths.mjs';

const leash = new URL('leash.mjs', import.meta.url).href;

/**
 * Starts the server in a process group of its own, so that Ctrl-C reaches it once, through us.
 * @param {NodeJS.ProcessEnv} env
 */
export function serve(env) {
  const child = spawn(process.execPath, ['--import', 'tsx', '--import', leash, join('server', 'index.ts')], {
    cwd: root,
    env,
    detached: true,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  /** @type {Promise<number>} */
  const exited = new Promise((done) => {
    child.on('error', () => done(1));
    child.on('exit', (code, signal) => done(code ?? (signal === 'SIGTERM' ? 0 : 1)));
  });
  return {
    exited,
    /** Asks for a clean end and insists after a while. */
    stop: async () => {
      child.kill('SIGTERM');
      const insist = setTimeout(() => child.kill('SIGKILL'), 20_000);
      await exited;
      clearTimeout(insist);
    },
  };
}

/**
 * Waits until the health check answers 200; false if `givenUp` settles first.
 * @param {string} address
 * @param {Promise<unknown>} givenUp
 */
export async function isHealthy(address, givenUp) {
  const ended = givenUp.then(() => true);
  for (;;) {
    try {
      const answer = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(2000) });
      if (answer.ok) return true;
    } catch {
      // Not listening yet.
    }
    if (await Promise.race([ended, pause(100, false)])) return false;
  }
}
