import type { Sequelize, Transaction } from 'sequelize';
import { User } from '#server/models/user.ts';

/** The database that the models are bound to. */
export function database(): Sequelize {
  if (!User.sequelize) throw new Error('The models are not bound to a database: call initModels first.');
  return User.sequelize;
}

/** Everything that `work` does happens, or nothing of it. */
export function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  return database().transaction(work);
}
