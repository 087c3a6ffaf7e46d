import { readdirSync } from 'node:fs';
import { QueryTypes, type Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DatabaseNewer, migrateDown, migrateUp, migrationStatus } from '#server/db/migrate.ts';
import { STEPS } from '#server/db/migrations/steps.ts';
import { openSequelize } from '#server/db/sequelize.ts';
import { ownDatabase } from '../support/database.ts';

let url: string;
let sequelize: Sequelize;
const names = STEPS.map(({ name }) => name);

/** Everything the steps make: tables with columns, constraints, indexes, triggers and functions. */
async function describeSchema(): Promise<string[]> {
  const rows = await sequelize.query<{ line: string }>(
    `SELECT format('%s.%s %s %s %s', table_name, column_name, data_type, is_nullable, column_default) AS line
       FROM information_schema.columns WHERE table_schema = 'public' AND table_name <> 'applied_steps'
     UNION ALL SELECT conrelid::regclass || ' ' || conname || ' ' || pg_get_constraintdef(oid)
       FROM pg_constraint WHERE connamespace = 'public'::regnamespace AND conrelid <> 'applied_steps'::regclass
     UNION ALL SELECT indexdef FROM pg_indexes WHERE schemaname = 'public' AND tablename <> 'applied_steps'
     UNION ALL SELECT pg_get_triggerdef(oid) FROM pg_trigger WHERE NOT tgisinternal
     UNION ALL SELECT pg_get_functiondef(oid) FROM pg_proc WHERE pronamespace = 'public'::regnamespace
     ORDER BY 1`,
    { type: QueryTypes.SELECT },
  );
  return rows.map(({ line }) => line);
}

beforeAll(async () => {
  url = await ownDatabase('migrate', 'empty');
  sequelize = openSequelize(url);
});
afterAll(() => sequelize.close());

describe('the steps of the database', () => {
  it('go all up, all down to nothing, and all up to the same again', async () => {
    expect(await migrateUp(sequelize)).toEqual(names);
    const first = await describeSchema();
    expect(first.length).toBeGreaterThan(100);
    expect(await migrateDown(sequelize, 'all')).toEqual(names.toReversed());
    expect(await describeSchema()).toEqual([]);
    expect(await migrateUp(sequelize)).toEqual(names);
    expect(await describeSchema()).toEqual(first);
  });

  it('are not done twice, and taken back one by one', async () => {
    expect(await migrateUp(sequelize)).toEqual([]);
    expect(await migrateDown(sequelize)).toEqual(names.slice(-1));
    expect(await migrationStatus(sequelize)).toEqual({ done: names.slice(0, -1), pending: names.slice(-1) });
    expect(await migrateUp(sequelize)).toEqual(names.slice(-1));
  });

  it('wait for each other when two servers start at once', async () => {
    await migrateDown(sequelize, 'all');
    const other = openSequelize(url);
    const done = await Promise.all([migrateUp(sequelize), migrateUp(other)]);
    await other.close();
    expect(done.map((steps) => steps.length).toSorted((a, b) => a - b)).toEqual([0, names.length]);
  });

  it('are refused in one sentence when the database is newer, and change nothing', async () => {
    const before = await describeSchema();
    await sequelize.query(`INSERT INTO applied_steps (name) VALUES ('29990101-1-later')`);
    await expect(migrateUp(sequelize)).rejects.toThrow(DatabaseNewer);
    await expect(migrateDown(sequelize)).rejects.toThrow(/newer Featherbeam \(step “29990101-1-later”\)/);
    expect(await describeSchema()).toEqual(before);
    await sequelize.query(`DELETE FROM applied_steps WHERE name = '29990101-1-later'`);
  });

  it('leave nothing of a step that fails in the middle', async () => {
    const failing = names.findIndex((name) => name.endsWith('-sheets'));
    while ((await migrationStatus(sequelize)).done.length > failing) await migrateDown(sequelize);
    const before = await describeSchema();
    await sequelize.query('CREATE FUNCTION refuse_change() RETURNS integer LANGUAGE sql AS $$ SELECT 1 $$');
    await expect(migrateUp(sequelize)).rejects.toThrow(/refuse_change/);
    await sequelize.query('DROP FUNCTION refuse_change()');
    expect(await describeSchema()).toEqual(before);
    expect(await migrateUp(sequelize)).toEqual(names.slice(failing));
  });

  it('are all in the list, in the order of their names', () => {
    const files = readdirSync(new URL('../../../server/db/migrations', import.meta.url));
    const steps = files.filter((file) => /^\d/.test(file)).map((file) => file.replace(/\.ts$/, ''));
    expect(names).toEqual(steps.toSorted((a, b) => a.localeCompare(b, 'en', { numeric: true })));
  });
});
