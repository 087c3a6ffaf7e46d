import type { Migration } from './migration.ts';

/** Who signs in, from where, and what keeps guessing and repeating in check. */
export const people: Migration = {
  name: '20261201-1-people',
  up: (sql) =>
    sql(`
      CREATE TABLE users (
        id uuid PRIMARY KEY,
        name text NOT NULL CONSTRAINT users_name_length CHECK (char_length(name) BETWEEN 1 AND 120),
        email text NOT NULL
          CONSTRAINT users_email_key UNIQUE
          CONSTRAINT users_email_length CHECK (char_length(email) BETWEEN 3 AND 254)
          CONSTRAINT users_email_lower CHECK (email = lower(email)),
        password_hash text NOT NULL CONSTRAINT users_password_hashed CHECK (password_hash LIKE '$argon2id$%'),
        role text NOT NULL DEFAULT 'user' CONSTRAINT users_role CHECK (role IN ('admin', 'user')),
        created_at timestamptz(3) NOT NULL DEFAULT now()
      );

      -- The session id itself is known to the browser only.
      CREATE TABLE sessions (
        id_hash text PRIMARY KEY CONSTRAINT sessions_id_hashed CHECK (id_hash ~ '^[0-9a-f]{64}$'),
        user_id uuid NOT NULL CONSTRAINT sessions_user REFERENCES users ON DELETE CASCADE,
        expires_at timestamptz(3) NOT NULL,
        created_at timestamptz(3) NOT NULL DEFAULT now()
      );
      CREATE INDEX sessions_user_id ON sessions (user_id);
      CREATE INDEX sessions_expires_at ON sessions (expires_at);

      CREATE TABLE idempotency_keys (
        user_id uuid NOT NULL CONSTRAINT idempotency_keys_user REFERENCES users ON DELETE CASCADE,
        key uuid NOT NULL,
        purpose text NOT NULL,
        made_id uuid NOT NULL,
        created_at timestamptz(3) NOT NULL DEFAULT now(),
        PRIMARY KEY (user_id, key)
      );
      CREATE INDEX idempotency_keys_created_at ON idempotency_keys (created_at);

      -- Counts are worth nothing after a crash, so they need no log; names are hashed.
      CREATE UNLOGGED TABLE rate_counters (
        name text PRIMARY KEY,
        hits integer NOT NULL,
        resets_at timestamptz(3) NOT NULL
      );
      CREATE INDEX rate_counters_resets_at ON rate_counters (resets_at);
    `),
  down: (sql) => sql('DROP TABLE rate_counters, idempotency_keys, sessions, users'),
};
