import { spawn, type ChildProcess } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { startCluster } from '#server/house/cluster.mjs';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const PATIENCE_MS = 60_000;

export interface Served {
  /** address of the served product */
  baseUrl: string;
  stop: () => Promise<void>;
  /** ends the server as a power cut would, in the middle of whatever it does; the database goes on */
  kill: () => Promise<void>;
  /** starts it again at the same address */
  restart: () => Promise<void>;
}

/** The product as `npm start` serves it: real server, real PostgreSQL of its own, built client, demo scenario. `clientDir` serves another build. */
export async function serve(clientDir?: string): Promise<Served> {
  const cluster = await startCluster({ throwaway: true });
  let server = launch(cluster.url(), '0', clientDir);
  const stop = async () => {
    await end(server, 'SIGTERM');
    await cluster.stop();
  };
  try {
    const baseUrl = await addressOf(server);
    return {
      baseUrl,
      stop,
      kill: () => end(server, 'SIGKILL'),
      restart: async () => {
        server = launch(cluster.url(), new URL(baseUrl).port, clientDir);
        await addressOf(server);
      },
    };
  } catch (error) {
    await stop();
    throw error;
  }
}

function launch(databaseUrl: string, port: string, clientDir: string | undefined): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: {
      ...process.env,
      DATABASE_URL: databaseUrl,
      PORT: port,
      ...(clientDir && { FEATHERBEAM_CLIENT_DIR: clientDir }),
      NODE_ENV: 'production',
      LOG_LEVEL: 'error',
      FEATHERBEAM_RATE_LIMIT_SCALE: '1000',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
}

function addressOf(server: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    const late = setTimeout(() => reject(new Error('the server did not start in time')), PATIENCE_MS);
    let said = '';
    server.stdout?.setEncoding('utf8').on('data', (text: string) => {
      said += text;
      const found = /listens on (http:\S+)/.exec(said)?.[1];
      if (!found) return;
      clearTimeout(late);
      resolve(found);
    });
    server.once('exit', (code) => {
      clearTimeout(late);
      reject(new Error(`the server ended with ${code}:\n${said}`));
    });
  });
}

async function end(server: ChildProcess, signal: NodeJS.Signals): Promise<void> {
  if (server.exitCode !== null || server.signalCode !== null) return;
  const ended = new Promise((resolve) => server.once('exit', resolve));
  server.kill(signal);
  await ended;
}
