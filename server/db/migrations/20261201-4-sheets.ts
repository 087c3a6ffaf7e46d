import type { Migration } from './migration.ts';

/**
 * Balance sheets, frozen. The database itself refuses to change or remove one, and a row of the save log
 * likewise; only with their whole glider, when its owner deletes it, do they go.
 */
export const sheets: Migration = {
  name: '20261201-4-sheets',
  up: (sql) =>
    sql(`
      CREATE TABLE sheets (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        number integer NOT NULL CONSTRAINT sheets_number CHECK (number >= 1),
        glider_name text NOT NULL,
        note text NOT NULL CONSTRAINT sheets_note_length CHECK (char_length(note) <= 2000),
        plan jsonb NOT NULL CONSTRAINT sheets_plan_object CHECK (jsonb_typeof(plan) = 'object'),
        result jsonb NOT NULL CONSTRAINT sheets_result_object CHECK (jsonb_typeof(result) = 'object'),
        calculator text NOT NULL CONSTRAINT sheets_calculator_named CHECK (calculator <> ''),
        sha256 text NOT NULL CONSTRAINT sheets_sha256 CHECK (sha256 ~ '^[0-9a-f]{64}$'),
        mass_g double precision NOT NULL,
        percent_mac double precision,
        wing_loading_g_dm2 double precision,
        saved_by uuid NOT NULL CONSTRAINT sheets_saved_by REFERENCES users ON DELETE RESTRICT,
        saved_by_name text NOT NULL,
        saved_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT sheets_glider_id_number_key UNIQUE (glider_id, number),
        CONSTRAINT sheets_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE
      );

      CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        -- The glider is gone already when its rows follow by cascade.
        IF TG_OP = 'DELETE' THEN
          IF NOT EXISTS (SELECT FROM gliders WHERE id = OLD.glider_id) THEN
            RETURN OLD;
          END IF;
        END IF;
        RAISE EXCEPTION 'rows of % are unchanging', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
      END $$;

      CREATE TRIGGER sheets_unchanging BEFORE UPDATE OR DELETE ON sheets
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER sheets_untruncated BEFORE TRUNCATE ON sheets
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER glider_saves_unchanging BEFORE UPDATE OR DELETE ON glider_saves
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER glider_saves_untruncated BEFORE TRUNCATE ON glider_saves
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    `),
  down: (sql) =>
    sql(`
      DROP TRIGGER glider_saves_untruncated ON glider_saves;
      DROP TRIGGER glider_saves_unchanging ON glider_saves;
      DROP TABLE sheets;
      DROP FUNCTION refuse_change();
    `),
};
