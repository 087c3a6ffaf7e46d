import './node-version.mjs';

const { live } = await import('./life.mjs');
const { HouseError } = await import('./messages.mjs');
const { ensurePackages } = await import('./packages.mjs');
const { openDatabase } = await import('./database.mjs');
const { run } = await import('./run.mjs');

/** @type {Record<string, string[]>} */
const COMMANDS = {
  migrate: ['server/db/migrate.ts', 'up'],
  rollback: ['server/db/migrate.ts', 'down'],
  seed: ['server/db/seed.ts'],
};

live(async () => {
  const [command = '', ...rest] = process.argv.slice(2);
  const [script, ...args] = COMMANDS[command] ?? [];
  if (!script) throw new HouseError('Say migrate, rollback or seed.');
  await ensurePackages();
  const env = { ...process.env, DATABASE_URL: await openDatabase() };
  return (await run(process.execPath, ['--import', 'tsx', script, ...args, ...rest], { env, show: true }))
    .code;
});
