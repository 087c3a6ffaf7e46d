import './node-version.mjs';

const os = await import('node:os');
const path = await import('node:path');
const { startCluster } = await import('./cluster.mjs');
const { ensurePostgres } = await import('./debian.mjs');
const { atEnd, live } = await import('./life.mjs');
const { portFrom, requireFree } = await import('./machine.mjs');
const { ensurePackages } = await import('./packages.mjs');
const { homeFor, isRoot, root } = await import('./paths.mjs');
const { run } = await import('./run.mjs');
const { claim } = await import('./running.mjs');

/** A home of its own, so that trying things out never touches the gliders kept by `npm start`. */
const home = process.env.FEATHERBEAM_HOME
  ? homeFor({ env: process.env, clone: root, asRoot: isRoot, userHome: os.homedir() })
  : `${homeFor({ env: {}, clone: root, asRoot: isRoot, userHome: os.homedir() })}-dev`;

async function database() {
  if (process.env.DATABASE_URL) return process.env.DATABASE_URL;
  const own = await claim(home, 'npm run dev');
  atEnd(own.release);
  await ensurePostgres();
  const cluster = await startCluster({ home });
  atEnd(cluster.stop);
  own.tellPort(cluster.port);
  return cluster.url();
}

live(
  async () => {
    const port = portFrom(process.env.API_PORT, 4311);
    await requireFree(port, '127.0.0.1');
    await ensurePackages();
    const api = {
      PORT: String(port),
      API_PORT: String(port),
      NODE_ENV: 'development',
      FEATHERBEAM_HOME: home,
    };
    const env = { ...process.env, ...api, DATABASE_URL: await database() };
    const tool = (/** @type {string[]} */ parts) => path.join(root, 'node_modules', ...parts);
    const watching = [
      tool(['tsx', 'dist', 'cli.mjs']),
      'watch',
      '--clear-screen=false',
      path.join('server', 'index.ts'),
    ];
    const server = run(process.execPath, watching, { env, show: true });
    const client = run(process.execPath, [tool(['vite', 'bin', 'vite.js'])], { env, show: true });
    return (await Promise.race([server, client])).code;
  },
  () => 0,
);
