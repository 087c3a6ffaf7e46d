import { Client } from 'pg';
import { inject } from 'vitest';

async function asAdmin(statement: string): Promise<void> {
  const client = new Client({ connectionString: inject('adminUrl') });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}

export function urlOf(name: string): string {
  const url = new URL(inject('adminUrl'));
  url.pathname = name;
  return url.href;
}

const DUPLICATE_DATABASE = '42P04';

/** The migrated database of this worker, made at its first test file; tests own their rows by their own users. */
export async function workerDatabase(): Promise<string> {
  const template = inject('template');
  const name = `${template}_w${process.env['VITEST_POOL_ID'] ?? '0'}`;
  await asAdmin(`CREATE DATABASE ${name} TEMPLATE ${template}`).catch((error: unknown) => {
    if (!(error instanceof Error && 'code' in error && error.code === DUPLICATE_DATABASE)) throw error;
  });
  return urlOf(name);
}

/** A database for one test file alone: empty, or migrated. */
export async function ownDatabase(name: string, content: 'empty' | 'migrated'): Promise<string> {
  const template = inject('template');
  const full = `${template}_${name}`;
  await asAdmin(`CREATE DATABASE ${full} TEMPLATE ${content === 'empty' ? 'template0' : template}`);
  return urlOf(full);
}
