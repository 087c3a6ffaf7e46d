import './node-version.mjs';

const { existsSync, renameSync, rmSync, statSync, writeFileSync } = await import('node:fs');
const { live } = await import('./life.mjs');
const { explain, HouseError, say } = await import('./messages.mjs');
const { clientProgram, openDatabase } = await import('./database.mjs');
const { fromCaller } = await import('./paths.mjs');
const { plainEnv } = await import('./postgres.mjs');
const { run, tail } = await import('./run.mjs');

live(async () => {
  const args = process.argv.slice(2);
  const [name] = args.filter((arg) => arg !== '--replace');
  if (!name) throw new HouseError('Name the file to write: npm run backup -- featherbeam.dump');
  const file = fromCaller(name);
  if (existsSync(file) && !args.includes('--replace')) {
    throw new HouseError(`${file} is there already: choose another name, or add --replace to overwrite it.`);
  }
  const url = await openDatabase();
  // Written beside and then moved: a backup broken off must not take the place of a good one.
  const unfinished = `${file}.unfinished`;
  writeFileSync(unfinished, '', { mode: 0o600 });
  const dump = ['-Fc', '--no-owner', '--no-privileges', '-f', unfinished, '-d', url];
  const { code, output } = await run(clientProgram('pg_dump'), dump, { env: plainEnv() });
  if (code !== 0) {
    rmSync(unfinished, { force: true });
    throw new HouseError(explain(output) ?? `The backup failed and wrote nothing:\n${tail(output)}`);
  }
  renameSync(unfinished, file);
  say(`Backed up to ${file} (${(statSync(file).size / 1024).toFixed(0)} KB).`);
  return 0;
});
