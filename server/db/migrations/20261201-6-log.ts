import type { Migration } from './migration.ts';

/** What each save changed, which one brought an older state back, and names to find states again by. */
export const log: Migration = {
  name: '20261201-6-log',
  up: (sql) =>
    sql(`
      -- Where the glider balances, mm aft of the datum: the next save tells by how much it moved.
      ALTER TABLE gliders ADD COLUMN balance_mm double precision;

      ALTER TABLE glider_saves
        ADD COLUMN changes jsonb
          CONSTRAINT glider_saves_changes_object CHECK (jsonb_typeof(changes) = 'object'),
        ADD COLUMN restored_from integer CONSTRAINT glider_saves_restored CHECK (restored_from < version);

      CREATE TABLE glider_save_names (
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        version integer NOT NULL,
        name text NOT NULL CONSTRAINT glider_save_names_length CHECK (char_length(name) BETWEEN 1 AND 120),
        PRIMARY KEY (glider_id, version),
        CONSTRAINT glider_save_names_save FOREIGN KEY (glider_id, version)
          REFERENCES glider_saves ON DELETE CASCADE,
        CONSTRAINT glider_save_names_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE
      );
    `),
  down: (sql) =>
    sql(`
      DROP TABLE glider_save_names;
      ALTER TABLE glider_saves DROP COLUMN changes, DROP COLUMN restored_from;
      ALTER TABLE gliders DROP COLUMN balance_mm;
    `),
};
