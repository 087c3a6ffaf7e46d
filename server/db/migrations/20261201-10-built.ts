import type { Migration } from './migration.ts';

/**
 * What was weighed while a glider was built, what it is built to, and its signed first flights. Weighings and
 * records are frozen like sheets: a correction is a row of its own that names the one whose place it takes.
 */
export const built: Migration = {
  name: '20261201-10-built',
  up: (sql) =>
    sql(`
      CREATE TABLE weighings (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        number integer NOT NULL CONSTRAINT weighings_number CHECK (number >= 1),
        body jsonb NOT NULL CONSTRAINT weighings_body_object CHECK (jsonb_typeof(body) = 'object'),
        corrects uuid CONSTRAINT weighings_corrects_key UNIQUE,
        weighed_by uuid NOT NULL CONSTRAINT weighings_weighed_by REFERENCES users ON DELETE RESTRICT,
        weighed_by_name text NOT NULL,
        received_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT weighings_glider_id_number_key UNIQUE (glider_id, number),
        CONSTRAINT weighings_glider_id_id_key UNIQUE (glider_id, id),
        CONSTRAINT weighings_corrected FOREIGN KEY (glider_id, corrects)
          REFERENCES weighings (glider_id, id) ON DELETE CASCADE,
        CONSTRAINT weighings_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );
      CREATE TRIGGER weighings_unchanging BEFORE UPDATE OR DELETE ON weighings
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER weighings_untruncated BEFORE TRUNCATE ON weighings
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();

      CREATE TABLE build_terms (
        owner_id uuid NOT NULL,
        glider_id uuid PRIMARY KEY,
        body jsonb NOT NULL CONSTRAINT build_terms_object CHECK (jsonb_typeof(body) = 'object'),
        version integer NOT NULL CONSTRAINT build_terms_version CHECK (version >= 2),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_by uuid CONSTRAINT build_terms_updated_by REFERENCES users ON DELETE SET NULL,
        CONSTRAINT build_terms_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );

      CREATE TABLE first_flights (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        number integer NOT NULL CONSTRAINT first_flights_number CHECK (number >= 1),
        body jsonb NOT NULL CONSTRAINT first_flights_body_object CHECK (jsonb_typeof(body) = 'object'),
        measured jsonb NOT NULL CONSTRAINT first_flights_measured CHECK (jsonb_typeof(measured) = 'object'),
        flown jsonb NOT NULL CONSTRAINT first_flights_flown CHECK (jsonb_typeof(flown) = 'object'),
        follows uuid,
        signed_by uuid NOT NULL CONSTRAINT first_flights_signed_by REFERENCES users ON DELETE RESTRICT,
        signed_by_name text NOT NULL,
        received_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT first_flights_glider_id_number_key UNIQUE (glider_id, number),
        CONSTRAINT first_flights_glider_id_id_key UNIQUE (glider_id, id),
        CONSTRAINT first_flights_followed FOREIGN KEY (glider_id, follows)
          REFERENCES first_flights (glider_id, id) ON DELETE CASCADE,
        CONSTRAINT first_flights_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );
      CREATE TRIGGER first_flights_unchanging BEFORE UPDATE OR DELETE ON first_flights
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER first_flights_untruncated BEFORE TRUNCATE ON first_flights
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    `),
  down: (sql) => sql(`DROP TABLE first_flights, build_terms, weighings;`),
};
