import type { Sequelize, Transaction } from 'sequelize';

/** One step of the database, both ways, each in one transaction. Steps import neither models nor `shared/`. */
export interface Migration {
  /** begins with its date; steps run in the order of their names */
  name: string;
  up: (sql: RunSql) => Promise<void>;
  down: (sql: RunSql) => Promise<void>;
}

export type RunSql = (statements: string) => Promise<void>;

export function sqlRunner(sequelize: Sequelize, transaction: Transaction): RunSql {
  return async (statements) => {
    await sequelize.query(statements, { transaction, raw: true });
  };
}
