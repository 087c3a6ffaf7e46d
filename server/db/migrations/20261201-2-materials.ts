import type { Migration } from './migration.ts';

/** The table of materials: shared rows without an owner, and private ones with. */
export const materials: Migration = {
  name: '20261201-2-materials',
  up: (sql) =>
    sql(`
      CREATE TABLE materials (
        id uuid PRIMARY KEY,
        key text NOT NULL
          CONSTRAINT materials_key_key UNIQUE
          CONSTRAINT materials_key_length CHECK (char_length(key) BETWEEN 1 AND 64),
        owner_id uuid CONSTRAINT materials_owner REFERENCES users ON DELETE RESTRICT,
        name text NOT NULL CONSTRAINT materials_name_length CHECK (char_length(name) BETWEEN 1 AND 120),
        category text NOT NULL CONSTRAINT materials_category CHECK (
          category IN ('wood', 'composite', 'metal', 'sheet', 'covering', 'finish', 'adhesive')),
        density_kg_m3 double precision
          CONSTRAINT materials_density CHECK (density_kg_m3 > 0 AND density_kg_m3 <= 25000),
        areal_g_m2 double precision
          CONSTRAINT materials_areal CHECK (areal_g_m2 > 0 AND areal_g_m2 <= 20000),
        spread_g_m2 double precision
          CONSTRAINT materials_spread CHECK (spread_g_m2 > 0 AND spread_g_m2 <= 5000),
        cv double precision NOT NULL CONSTRAINT materials_cv CHECK (cv >= 0 AND cv <= 1),
        modulus_gpa double precision
          CONSTRAINT materials_modulus CHECK (modulus_gpa > 0 AND modulus_gpa <= 1000),
        strength_mpa double precision
          CONSTRAINT materials_strength CHECK (strength_mpa > 0 AND strength_mpa <= 10000),
        moisture double precision CONSTRAINT materials_moisture CHECK (moisture >= 0 AND moisture <= 1),
        form text NOT NULL CONSTRAINT materials_form_length CHECK (char_length(form) <= 2000),
        source text NOT NULL CONSTRAINT materials_source_length CHECK (char_length(source) BETWEEN 1 AND 2000),
        basis text NOT NULL CONSTRAINT materials_basis CHECK (
          basis IN ('published', 'common practice', 'from memory', 'own measurement')),
        version integer NOT NULL DEFAULT 1 CONSTRAINT materials_version CHECK (version >= 1),
        created_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT materials_sold_somehow CHECK (num_nonnulls(density_kg_m3, areal_g_m2, spread_g_m2) >= 1)
      );
      CREATE INDEX materials_owner_id ON materials (owner_id);

      -- What was seeded, and as what: a row that an admin edited or deleted since is left so.
      CREATE TABLE material_seeds (
        key text PRIMARY KEY,
        digest text NOT NULL,
        version integer NOT NULL
      );
    `),
  down: (sql) => sql('DROP TABLE material_seeds, materials'),
};
