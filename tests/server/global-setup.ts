import { Client } from 'pg';
import type { TestProject } from 'vitest/node';
import { migrateUp } from '#server/db/migrate.ts';
import { openSequelize } from '#server/db/sequelize.ts';
import { startCluster } from '#server/house/cluster.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** address of a database whose user may create others */
    adminUrl: string;
    /** name of the migrated database that each worker clones, and beginning of every test database's name */
    template: string;
  }
}

/** One migrated database for all; on a throw-away PostgreSQL, or on the one that DATABASE_URL_TEST_ADMIN names. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env['DATABASE_URL_TEST_ADMIN'];
  const cluster = given ? undefined : await startCluster({ throwaway: true });
  const adminUrl = given ?? cluster?.url('postgres') ?? '';
  const template = `featherbeam_test_${process.pid}`;
  await admin(adminUrl, (client) => client.query(`CREATE DATABASE ${template}`));
  const url = new URL(adminUrl);
  url.pathname = template;
  const sequelize = openSequelize(url.href);
  await migrateUp(sequelize);
  await sequelize.close();
  project.provide('adminUrl', adminUrl);
  project.provide('template', template);
  return async () => {
    if (cluster) await cluster.stop();
    else await admin(adminUrl, (client) => dropAll(client, template));
  };
}

async function admin(url: string, work: (client: Client) => Promise<unknown>): Promise<void> {
  const client = new Client({ connectionString: url });
  await client.connect();
  await work(client);
  await client.end();
}

async function dropAll(client: Client, beginning: string): Promise<void> {
  const { rows } = await client.query<{ datname: string }>(
    'SELECT datname FROM pg_database WHERE starts_with(datname, $1)',
    [beginning],
  );
  for (const { datname } of rows) await client.query(`DROP DATABASE IF EXISTS ${datname} WITH (FORCE)`);
}
