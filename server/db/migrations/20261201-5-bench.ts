import type { Migration } from './migration.ts';

/**
 * Gliders put away, and the bench in every order from one index: a member's row carries what the bench is ordered
 * and searched by, kept in step by the database itself.
 */
export const bench: Migration = {
  name: '20261201-5-bench',
  up: (sql) =>
    sql(`
      ALTER TABLE gliders ADD COLUMN archived_at timestamptz(3);
      DROP INDEX gliders_newest;

      -- Small letters without their accents, so that Ä stands beside a.
      CREATE FUNCTION sort_key(name text) RETURNS text LANGUAGE sql IMMUTABLE PARALLEL SAFE AS $$
        SELECT lower(regexp_replace(normalize(name, NFKD), '[\\u0300-\\u036f]', '', 'g'))
      $$;

      ALTER TABLE glider_members
        ADD COLUMN joined_at timestamptz(3) NOT NULL DEFAULT now(),
        ADD COLUMN name_key text,
        ADD COLUMN mass_g double precision,
        ADD COLUMN changed_at timestamptz(3),
        ADD COLUMN archived boolean;
      UPDATE glider_members AS member SET
        name_key = sort_key(glider.name), mass_g = glider.mass_g, changed_at = glider.updated_at, archived = false
        FROM gliders AS glider WHERE glider.id = member.glider_id;
      ALTER TABLE glider_members
        ALTER COLUMN name_key SET NOT NULL,
        ALTER COLUMN mass_g SET NOT NULL,
        ALTER COLUMN changed_at SET NOT NULL,
        ALTER COLUMN archived SET NOT NULL;
      DROP INDEX glider_members_user_id;
      CREATE INDEX glider_members_by_change ON glider_members (user_id, archived, changed_at, glider_id);
      CREATE INDEX glider_members_by_name ON glider_members (user_id, archived, name_key, glider_id);
      CREATE INDEX glider_members_by_mass ON glider_members (user_id, archived, mass_g, glider_id);

      CREATE FUNCTION place_member() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        SELECT sort_key(name), mass_g, updated_at, archived_at IS NOT NULL
          INTO NEW.name_key, NEW.mass_g, NEW.changed_at, NEW.archived
          FROM gliders WHERE id = NEW.glider_id;
        RETURN NEW;
      END $$;
      CREATE TRIGGER glider_members_placed BEFORE INSERT ON glider_members
        FOR EACH ROW EXECUTE FUNCTION place_member();

      CREATE FUNCTION place_members() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        UPDATE glider_members SET name_key = sort_key(NEW.name), mass_g = NEW.mass_g,
          changed_at = NEW.updated_at, archived = NEW.archived_at IS NOT NULL
          WHERE glider_id = NEW.id;
        RETURN NEW;
      END $$;
      CREATE TRIGGER gliders_placed AFTER UPDATE OF name, mass_g, updated_at, archived_at ON gliders
        FOR EACH ROW EXECUTE FUNCTION place_members();
    `),
  down: (sql) =>
    sql(`
      DROP TRIGGER gliders_placed ON gliders;
      DROP TRIGGER glider_members_placed ON glider_members;
      DROP FUNCTION place_members, place_member;
      ALTER TABLE glider_members DROP COLUMN joined_at, DROP COLUMN name_key, DROP COLUMN mass_g,
        DROP COLUMN changed_at, DROP COLUMN archived;
      CREATE INDEX glider_members_user_id ON glider_members (user_id);
      DROP FUNCTION sort_key;
      ALTER TABLE gliders DROP COLUMN archived_at;
      CREATE INDEX gliders_newest ON gliders (updated_at DESC, id DESC);
    `),
};
