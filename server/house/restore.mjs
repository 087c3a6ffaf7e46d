import './node-version.mjs';

const { existsSync } = await import('node:fs');
const { live } = await import('./life.mjs');
const { explain, HouseError, say } = await import('./messages.mjs');
const { clientProgram, openDatabase } = await import('./database.mjs');
const { fromCaller } = await import('./paths.mjs');
const { plainEnv } = await import('./postgres.mjs');
const { run, tail } = await import('./run.mjs');

const OWN_SCHEMAS = `nspname !~ '^pg_' AND nspname <> 'information_schema'`;
const COUNT_TABLES = `SELECT count(*) FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
  WHERE c.relkind IN ('r', 'p', 'v', 'm', 'S') AND ${OWN_SCHEMAS}`;
const CLEAR = `DO $$ DECLARE name text; BEGIN
  FOR name IN SELECT nspname FROM pg_namespace WHERE ${OWN_SCHEMAS} LOOP
    EXECUTE format('DROP SCHEMA %I CASCADE', name);
  END LOOP;
END $$;
CREATE SCHEMA public AUTHORIZATION pg_database_owner;
GRANT USAGE ON SCHEMA public TO PUBLIC;
`;

/** @param {string} url @param {string[]} args @param {string} [input] */
const psql = (url, args, input) =>
  run(clientProgram('psql'), ['-X', '-q', '-v', 'ON_ERROR_STOP=1', '-d', url, ...args], {
    env: plainEnv(),
    input,
  });

live(async () => {
  const args = process.argv.slice(2);
  const [name] = args.filter((arg) => arg !== '--replace');
  if (!name) throw new HouseError('Name the backup to restore: npm run restore -- featherbeam.dump');
  const file = fromCaller(name);
  if (!existsSync(file)) throw new HouseError(`There is no file ${file}.`);
  const url = await openDatabase({ alone: true });

  const counted = await psql(url, ['-At', '-c', COUNT_TABLES]);
  if (counted.code !== 0) throw new HouseError(`The database does not answer:\n${tail(counted.output)}`);
  const isEmpty = counted.output.trim() === '0';
  if (!isEmpty && !args.includes('--replace')) {
    throw new HouseError(
      'The database is not empty: back it up, then add --replace to put the backup in its place.',
    );
  }
  const script = await run(clientProgram('pg_restore'), ['--no-owner', '--no-privileges', '-f', '-', file], {
    env: plainEnv(),
  });
  if (script.code !== 0)
    throw new HouseError(`${file} is no backup that can be read:\n${tail(script.output, 3)}`);
  // One transaction: either all of the backup takes the place of what was there, or nothing changes.
  const restored = await psql(
    url,
    ['--single-transaction', '-f', '-'],
    (isEmpty ? '' : CLEAR) + script.output,
  );
  if (restored.code !== 0)
    throw new HouseError(explain(restored.output) ?? `Nothing was restored:\n${tail(restored.output)}`);
  say(`Restored from ${file}.`);
  return 0;
});
