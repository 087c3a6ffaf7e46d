import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ensureClient } from './client-build.mjs';
import { startCluster } from './cluster.mjs';
import { ensurePostgres } from './debian.mjs';
import { demoLines } from './demo.mjs';
import { atEnd } from './life.mjs';
import { addressOf, portFrom, requireFree, requireSpace } from './machine.mjs';
import { say } from './messages.mjs';
import { ensurePackages, packagesAreCurrent } from './packages.mjs';
import { home, root } from './paths.mjs';
import { claim } from './running.mjs';
import { isHealthy, serve } from './serve.mjs';

const LEAST_MB = 300;
const PACKAGES_MB = 700;

let isUp = false;

/** Ctrl-C is how a running product is meant to be stopped; before that it is a broken-off start. */
export const interruptedCode = () => (isUp ? 0 : 130);

/**
 * Our own cluster, which ends with us.
 * @param {Awaited<ReturnType<typeof claim>>} own
 */
async function ownDatabase(own) {
  await ensurePostgres();
  const cluster = await startCluster({ home });
  atEnd(cluster.stop);
  own.tellPort(cluster.port);
  return cluster.url();
}

/** `npm start`: everything from a fresh clone to a product that answers. */
export async function launchProduct() {
  const port = portFrom(process.env.PORT, 4310);
  const host = process.env.HOST || '127.0.0.1';
  const address = addressOf(host, port);
  requireSpace(root, packagesAreCurrent() ? LEAST_MB : PACKAGES_MB);
  requireSpace(home, LEAST_MB);
  const given = process.env.DATABASE_URL;
  const own = given ? null : await claim(home, address);
  if (own) atEnd(own.release);
  await requireFree(port, host);
  await ensurePackages();
  await ensureClient();
  const url = own ? await ownDatabase(own) : given;

  const settings = {
    DATABASE_URL: url,
    PORT: String(port),
    HOST: host,
    FEATHERBEAM_HOME: home,
    NODE_ENV: 'production',
  };
  const server = serve({ ...process.env, ...settings });
  atEnd(server.stop);
  if (own) atEnd(own.leave);
  if (await isHealthy(address, server.exited)) {
    isUp = true;
    say(`\nOpen ${address} in a browser; Ctrl-C here stops it.`);
    const people = join(root, 'data', 'demo', 'people.json');
    for (const line of existsSync(people) ? demoLines(JSON.parse(readFileSync(people, 'utf8'))) : [])
      say(line);
  }
  return server.exited;
}
