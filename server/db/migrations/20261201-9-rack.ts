import type { Migration } from './migration.ts';

/**
 * The rack: sheets and sticks of a user, and what a glider keeps of its choice of wood. A piece is a user's own, so
 * its rows carry that user's id; trials and assignments carry the glider owner's.
 */
export const rack: Migration = {
  name: '20261201-9-rack',
  up: (sql) =>
    sql(`
      -- Labels count up for each user; what was given once is never given again, whatever is deleted.
      CREATE TABLE rack_counters (
        user_id uuid PRIMARY KEY CONSTRAINT rack_counters_user REFERENCES users ON DELETE CASCADE,
        last_number integer NOT NULL CONSTRAINT rack_counters_last CHECK (last_number >= 1)
      );

      CREATE TABLE stock_pieces (
        id uuid PRIMARY KEY,
        user_id uuid NOT NULL CONSTRAINT stock_pieces_user REFERENCES users ON DELETE CASCADE,
        number integer NOT NULL CONSTRAINT stock_pieces_number CHECK (number >= 1),
        kind text NOT NULL CONSTRAINT stock_pieces_kind CHECK (kind IN ('sheet', 'stick', 'block', 'tube')),
        material_key text
          CONSTRAINT stock_pieces_material_key CHECK (char_length(material_key) BETWEEN 1 AND 64),
        material_name text NOT NULL
          CONSTRAINT stock_pieces_material_name CHECK (char_length(material_name) BETWEEN 1 AND 120),
        material_category text NOT NULL CONSTRAINT stock_pieces_material_category CHECK (
          material_category IN ('wood', 'composite', 'metal', 'sheet', 'covering', 'finish', 'adhesive')),
        length_mm double precision NOT NULL
          CONSTRAINT stock_pieces_length CHECK (length_mm > 0 AND length_mm <= 20000),
        width_mm double precision NOT NULL
          CONSTRAINT stock_pieces_width CHECK (width_mm > 0 AND width_mm <= 20000),
        thickness_mm double precision NOT NULL
          CONSTRAINT stock_pieces_thickness CHECK (thickness_mm > 0 AND thickness_mm <= 20000),
        wall_mm double precision CONSTRAINT stock_pieces_wall CHECK (wall_mm > 0 AND wall_mm <= 20000),
        mass_g double precision CONSTRAINT stock_pieces_mass CHECK (mass_g > 0 AND mass_g <= 100000),
        resolution_g double precision
          CONSTRAINT stock_pieces_resolution CHECK (resolution_g > 0 AND resolution_g <= 100000),
        density_kg_m3 double precision
          CONSTRAINT stock_pieces_density CHECK (density_kg_m3 > 0 AND density_kg_m3 <= 25001),
        grade text NOT NULL CONSTRAINT stock_pieces_grade_length CHECK (char_length(grade) <= 120),
        grain_cut text CONSTRAINT stock_pieces_grain_cut CHECK (grain_cut IN ('A', 'B', 'C')),
        note text NOT NULL CONSTRAINT stock_pieces_note_length CHECK (char_length(note) <= 2000),
        state text NOT NULL DEFAULT 'free'
          CONSTRAINT stock_pieces_state CHECK (state IN ('free', 'reserved', 'used', 'split')),
        weighed boolean NOT NULL,
        glider_id uuid CONSTRAINT stock_pieces_glider REFERENCES gliders ON DELETE SET NULL,
        parent_id uuid,
        parent_number integer,
        photo_file uuid CONSTRAINT stock_pieces_photo_file_key UNIQUE,
        version integer NOT NULL DEFAULT 1 CONSTRAINT stock_pieces_version CHECK (version >= 1),
        created_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        on_rack boolean NOT NULL GENERATED ALWAYS AS (state IN ('free', 'reserved')) STORED,
        CONSTRAINT stock_pieces_user_id_id_key UNIQUE (user_id, id),
        CONSTRAINT stock_pieces_user_id_number_key UNIQUE (user_id, number),
        CONSTRAINT stock_pieces_parent FOREIGN KEY (user_id, parent_id)
          REFERENCES stock_pieces (user_id, id) ON DELETE SET NULL (parent_id),
        CONSTRAINT stock_pieces_tube CHECK ((kind = 'tube') = (wall_mm IS NOT NULL)),
        CONSTRAINT stock_pieces_weighed CHECK (mass_g IS NOT NULL OR (NOT weighed AND resolution_g IS NULL)),
        CONSTRAINT stock_pieces_dense CHECK ((mass_g IS NULL) = (density_kg_m3 IS NULL)),
        CONSTRAINT stock_pieces_place CHECK (
          CASE state WHEN 'reserved' THEN glider_id IS NOT NULL
                     WHEN 'used' THEN true
                     ELSE glider_id IS NULL END)
      );
      CREATE INDEX stock_pieces_parent_id ON stock_pieces (user_id, parent_id);
      CREATE INDEX stock_pieces_glider_id ON stock_pieces (glider_id);
      -- One for each order of the rack. What has no mass comes last, whichever way the order goes.
      CREATE INDEX stock_pieces_by_number ON stock_pieces (user_id, on_rack, number);
      CREATE INDEX stock_pieces_by_material ON stock_pieces (user_id, on_rack, sort_key(material_name), number);
      CREATE INDEX stock_pieces_by_length ON stock_pieces (user_id, on_rack, length_mm, number);
      CREATE INDEX stock_pieces_by_thickness ON stock_pieces (user_id, on_rack, thickness_mm, number);
      CREATE INDEX stock_pieces_by_mass
        ON stock_pieces (user_id, on_rack, coalesce(mass_g, 'Infinity'), number);
      CREATE INDEX stock_pieces_by_mass_down
        ON stock_pieces (user_id, on_rack, coalesce(mass_g, '-Infinity'), number);
      CREATE INDEX stock_pieces_by_density
        ON stock_pieces (user_id, on_rack, coalesce(density_kg_m3, 'Infinity'), number);
      CREATE INDEX stock_pieces_by_density_down
        ON stock_pieces (user_id, on_rack, coalesce(density_kg_m3, '-Infinity'), number);

      -- What a glider holds is free again when the glider goes; what was built into it stays used.
      CREATE FUNCTION free_stock() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        UPDATE stock_pieces SET state = 'free', glider_id = NULL, version = version + 1, updated_at = now()
          WHERE glider_id = OLD.id AND state = 'reserved';
        RETURN OLD;
      END $$;
      CREATE TRIGGER gliders_stock_freed BEFORE DELETE ON gliders
        FOR EACH ROW EXECUTE FUNCTION free_stock();

      CREATE FUNCTION give_up_stock_photo() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        INSERT INTO unused_files (key, remove_after)
          VALUES ('photos/' || OLD.photo_file || '.jpg', now()),
                 ('photos/' || OLD.photo_file || '.small.jpg', now())
          ON CONFLICT DO NOTHING;
        RETURN NULL;
      END $$;
      CREATE TRIGGER stock_pieces_photo_replaced AFTER UPDATE OF photo_file ON stock_pieces
        FOR EACH ROW WHEN (OLD.photo_file IS NOT NULL AND OLD.photo_file IS DISTINCT FROM NEW.photo_file)
        EXECUTE FUNCTION give_up_stock_photo();
      CREATE TRIGGER stock_pieces_photo_given_up AFTER DELETE ON stock_pieces
        FOR EACH ROW WHEN (OLD.photo_file IS NOT NULL) EXECUTE FUNCTION give_up_stock_photo();

      -- What a file has brought in, so that its repetition is answered alike.
      CREATE TABLE rack_imports (
        user_id uuid NOT NULL CONSTRAINT rack_imports_user REFERENCES users ON DELETE CASCADE,
        id uuid NOT NULL,
        count integer NOT NULL CONSTRAINT rack_imports_count CHECK (count BETWEEN 1 AND 2000),
        first_number integer NOT NULL,
        last_number integer NOT NULL,
        made_at timestamptz(3) NOT NULL DEFAULT now(),
        PRIMARY KEY (user_id, id)
      );

      CREATE TABLE glider_trials (
        owner_id uuid NOT NULL,
        glider_id uuid PRIMARY KEY,
        trials jsonb NOT NULL CONSTRAINT glider_trials_array CHECK (jsonb_typeof(trials) = 'array'),
        terms jsonb NOT NULL CONSTRAINT glider_trials_terms CHECK (jsonb_typeof(terms) = 'object'),
        version integer NOT NULL CONSTRAINT glider_trials_version CHECK (version >= 2),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_by uuid CONSTRAINT glider_trials_updated_by REFERENCES users ON DELETE SET NULL,
        CONSTRAINT glider_trials_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );

      CREATE TABLE glider_assignments (
        owner_id uuid NOT NULL,
        glider_id uuid PRIMARY KEY,
        entries jsonb NOT NULL CONSTRAINT glider_assignments_array CHECK (jsonb_typeof(entries) = 'array'),
        terms jsonb NOT NULL CONSTRAINT glider_assignments_terms CHECK (jsonb_typeof(terms) = 'object'),
        glider_version integer NOT NULL
          CONSTRAINT glider_assignments_glider_version CHECK (glider_version >= 1),
        version integer NOT NULL CONSTRAINT glider_assignments_version CHECK (version >= 2),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_by uuid CONSTRAINT glider_assignments_updated_by REFERENCES users ON DELETE SET NULL,
        CONSTRAINT glider_assignments_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );
    `),
  down: (sql) =>
    sql(`
      DROP TABLE glider_assignments, glider_trials, rack_imports;
      DROP TRIGGER gliders_stock_freed ON gliders;
      DROP TABLE stock_pieces, rack_counters;
      DROP FUNCTION free_stock, give_up_stock_photo;
    `),
};
