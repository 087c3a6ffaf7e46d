import { Sequelize } from 'sequelize';

/** A pool of connections; nothing is connected until the first query. */
export function openSequelize(databaseUrl: string): Sequelize {
  return new Sequelize(databaseUrl, {
    dialect: 'postgres',
    logging: false,
    pool: { max: 10, min: 0, acquire: 10_000, idle: 10_000 },
    dialectOptions: {
      application_name: 'featherbeam',
      connectionTimeoutMillis: 5_000,
      // No request may hold a lock or a connection for ever.
      statement_timeout: 20_000,
      lock_timeout: 10_000,
      idle_in_transaction_session_timeout: 30_000,
    },
    define: { underscored: true, timestamps: false },
  });
}
