import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { createApp } from './app.ts';
import { connect, DatabaseUnusable } from './db/connect.ts';
import { DatabaseNewer, migrateUp } from './db/migrate.ts';
import { seedDemo } from './db/seed-demo.ts';
import { SeedError } from './db/seed-files.ts';
import { seedClasses } from './db/seed-classes.ts';
import { seedMaterials } from './db/seed-materials.ts';
import { openSequelize } from './db/sequelize.ts';
import { EnvError, readEnv, type Env } from './env.ts';
import { home } from './house/paths.mjs';
import { employPostman, smtpSender, type Postman } from './mail/delivery.ts';
import { createLogger } from './middleware/request-log.ts';
import { tidyHourly } from './services/housekeeping.ts';
import { folderStore } from './storage/folder-store.ts';

/** How long a request under way may take to finish when the server is told to stop. */
const STOP_PATIENCE_MS = 4_000;

class PortTaken extends Error {}

function listen(server: Server, port: number, host: string): Promise<AddressInfo> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      const sentences: Record<string, string> = {
        EADDRINUSE: `Port ${port} on ${host} is taken by another program. Stop it, or choose another with PORT.`,
        EACCES: `This user may not listen on port ${port}. Choose one above 1023 with PORT.`,
      };
      const sentence = sentences[error.code ?? ''];
      reject(sentence ? new PortTaken(sentence) : error);
    });
    server.listen(port, host, () => resolve(server.address() as AddressInfo)); // an AddressInfo for any TCP port
  });
}

/** Served on loopback, and known by no other address. */
const isOnlyHere = ({ HOST, FEATHERBEAM_ADDRESS }: Env) =>
  FEATHERBEAM_ADDRESS === undefined && ['127.0.0.1', '::1', 'localhost'].includes(HOST);

async function main(): Promise<void> {
  const env = readEnv();
  const logger = createLogger(env.LOG_LEVEL);
  const sequelize = openSequelize(env.DATABASE_URL);
  await connect(sequelize);
  await migrateUp(sequelize);
  let port = env.PORT;
  let postman: Postman | undefined;
  const app = createApp({
    sequelize,
    logger,
    clientDir: env.FEATHERBEAM_CLIENT_DIR,
    rateLimitScale: env.FEATHERBEAM_RATE_LIMIT_SCALE,
    proxies: env.FEATHERBEAM_PROXIES,
    surroundings: {
      files: folderStore(env.FEATHERBEAM_FILES ?? join(home, 'files')),
      address: () => env.FEATHERBEAM_ADDRESS ?? `http://${env.HOST}:${port}`,
      // Whoever reads a mail can follow its link: they are shown only where nobody but this machine is served.
      mailsAreShown: env.FEATHERBEAM_SMTP_URL === undefined && isOnlyHere(env),
      mailWaits: () => postman?.wake(),
    },
  });
  await seedMaterials();
  await seedClasses();
  await seedDemo();

  const server = createServer(app);
  if (env.FEATHERBEAM_SMTP_URL !== undefined) {
    const send = smtpSender(env.FEATHERBEAM_SMTP_URL, env.FEATHERBEAM_MAIL_FROM);
    postman = employPostman(send, (error) => logger.error({ err: error }, 'sending mail failed'));
  }
  const stopTidying = tidyHourly((error) => logger.error({ err: error }, 'tidying failed'));
  // The system has chosen where it was left the choice.
  port = (await listen(server, env.PORT, env.HOST)).port;

  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    stopTidying();
    const closed = new Promise((resolve) => server.close(resolve));
    server.closeIdleConnections();
    // A query that hangs must not keep the program from ending.
    setTimeout(() => process.exit(1), 2 * STOP_PATIENCE_MS).unref();
    const impatience = setTimeout(() => server.closeAllConnections(), STOP_PATIENCE_MS);
    await closed;
    clearTimeout(impatience);
    await postman?.stop();
    await sequelize.close();
    process.exit(0);
  };
  process.on('SIGINT', () => void stop());
  process.on('SIGTERM', () => void stop());
  console.log(`Featherbeam listens on http://${env.HOST}:${port}`);
}

const EXPECTED = [EnvError, DatabaseUnusable, DatabaseNewer, SeedError, PortTaken];

main().catch((error: unknown) => {
  const expected = EXPECTED.some((kind) => error instanceof kind);
  console.error(expected && error instanceof Error ? error.message : error);
  process.exit(1);
});
