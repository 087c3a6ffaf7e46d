import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { Umzug, type RunnableMigration } from 'umzug';
import { readEnv } from '#server/env.ts';
import { isMainModule } from '#server/main-module.ts';
import { connect } from './connect.ts';
import { sqlRunner, type Migration } from './migrations/migration.ts';
import { STEPS } from './migrations/steps.ts';
import { openSequelize } from './sequelize.ts';

/** The database has steps that this version does not know. */
export class DatabaseNewer extends Error {
  constructor(step: string) {
    super(
      `The database was made by a newer Featherbeam (step “${step}”). Start that version, or another database.`,
    );
  }
}

/** The same number in every copy of the server, so that two that start at once migrate one after the other. */
const MIGRATION_LOCK = 4_310_001;

async function appliedSteps(sequelize: Sequelize): Promise<string[]> {
  const rows = await sequelize.query<{ name: string }>('SELECT name FROM applied_steps ORDER BY name', {
    type: QueryTypes.SELECT,
  });
  return rows.map((row) => row.name);
}

/** A step and its mark in `applied_steps` are one transaction: a step is never half done, nor done unmarked. */
function runnable(sequelize: Sequelize, step: Migration): RunnableMigration<Sequelize> {
  const inTransaction = (mark: string, run: Migration['up']) =>
    sequelize.transaction(async (transaction: Transaction) => {
      await sequelize.query('SET LOCAL statement_timeout = 0', { transaction });
      await run(sqlRunner(sequelize, transaction));
      await sequelize.query(mark, { transaction, replacements: [step.name] });
    });
  return {
    name: step.name,
    up: () => inTransaction('INSERT INTO applied_steps (name) VALUES (?)', step.up),
    down: () => inTransaction('DELETE FROM applied_steps WHERE name = ?', step.down),
  };
}

async function withMigrator<T>(
  sequelize: Sequelize,
  work: (umzug: Umzug<Sequelize>) => Promise<T>,
): Promise<T> {
  return sequelize.transaction(async (transaction) => {
    // Another copy may be migrating for minutes; this transaction only waits for it, and then holds the lock.
    for (const limit of ['statement_timeout', 'lock_timeout', 'idle_in_transaction_session_timeout']) {
      await sequelize.query(`SET LOCAL ${limit} = 0`, { transaction });
    }
    await sequelize.query(`SELECT pg_advisory_xact_lock(${MIGRATION_LOCK})`, { transaction });
    await sequelize.query(
      `CREATE TABLE IF NOT EXISTS applied_steps (name text PRIMARY KEY, applied_at timestamptz NOT NULL DEFAULT now())`,
    );
    const unknown = (await appliedSteps(sequelize)).find((name) => !STEPS.some((step) => step.name === name));
    if (unknown !== undefined) throw new DatabaseNewer(unknown);
    const umzug = new Umzug<Sequelize>({
      migrations: STEPS.map((step) => runnable(sequelize, step)),
      context: sequelize,
      storage: {
        executed: () => appliedSteps(sequelize),
        logMigration: async () => {}, // marked by the step's own transaction
        unlogMigration: async () => {},
      },
      logger: undefined,
    });
    return work(umzug);
  });
}

/**
 * Brings the database up to this version.
 * @returns names of the steps that were done
 * @throws DatabaseNewer when the database is ahead of this version
 */
export async function migrateUp(sequelize: Sequelize): Promise<string[]> {
  return withMigrator(sequelize, async (umzug) => (await umzug.up()).map((step) => step.name));
}

/** Takes the last step back, or all of them. */
export async function migrateDown(sequelize: Sequelize, how: 'last' | 'all' = 'last'): Promise<string[]> {
  return withMigrator(sequelize, async (umzug) =>
    (await umzug.down(how === 'all' ? { to: 0 } : {})).map((step) => step.name),
  );
}

/** Steps done, and steps still to do. */
export async function migrationStatus(sequelize: Sequelize): Promise<{ done: string[]; pending: string[] }> {
  return withMigrator(sequelize, async (umzug) => ({
    done: (await umzug.executed()).map((step) => step.name),
    pending: (await umzug.pending()).map((step) => step.name),
  }));
}

async function main([command = 'up', how]: string[]): Promise<string> {
  const sequelize = openSequelize(readEnv().DATABASE_URL);
  try {
    await connect(sequelize);
    switch (command) {
      case 'up':
        return `Done: ${(await migrateUp(sequelize)).join(', ') || 'nothing to do'}.`;
      case 'down':
        return `Taken back: ${(await migrateDown(sequelize, how === 'all' ? 'all' : 'last')).join(', ') || 'nothing'}.`;
      case 'status': {
        const { done, pending } = await migrationStatus(sequelize);
        return `Done: ${done.join(', ') || 'nothing'}. To do: ${pending.join(', ') || 'nothing'}.`;
      }
      default:
        return `Unknown command “${command}”. Use up, down, down all or status.`;
    }
  } finally {
    await sequelize.close();
  }
}

if (isMainModule(import.meta.url)) {
  try {
    console.log(await main(process.argv.slice(2)));
  } catch (error) {
    console.error(error instanceof Error ? error.message : String(error));
    process.exitCode = 1;
  }
}
