import type { Migration } from './migration.ts';

/**
 * Gliders, who may do what with them, what wood they use, and the log of every save. Every row carries the
 * owner's id, so that the tables can be spread over several machines by owner.
 */
export const gliders: Migration = {
  name: '20261201-3-gliders',
  up: (sql) =>
    sql(`
      CREATE TABLE gliders (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL CONSTRAINT gliders_owner REFERENCES users ON DELETE RESTRICT,
        name text NOT NULL CONSTRAINT gliders_name_length CHECK (char_length(name) BETWEEN 1 AND 120),
        plan jsonb NOT NULL CONSTRAINT gliders_plan_object CHECK (jsonb_typeof(plan) = 'object'),
        version integer NOT NULL DEFAULT 1 CONSTRAINT gliders_version CHECK (version >= 1),
        mass_g double precision NOT NULL CONSTRAINT gliders_mass CHECK (mass_g >= 0 AND mass_g < 'Infinity'),
        percent_mac double precision,
        wing_loading_g_dm2 double precision,
        outline jsonb NOT NULL CONSTRAINT gliders_outline_array CHECK (jsonb_typeof(outline) = 'array'),
        updated_by uuid NOT NULL CONSTRAINT gliders_updated_by REFERENCES users ON DELETE RESTRICT,
        created_at timestamptz(3) NOT NULL DEFAULT now(),
        updated_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT gliders_owner_id_id_key UNIQUE (owner_id, id)
      );
      CREATE INDEX gliders_newest ON gliders (updated_at DESC, id DESC);

      CREATE TABLE glider_members (
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        user_id uuid NOT NULL CONSTRAINT glider_members_user REFERENCES users ON DELETE RESTRICT,
        role text NOT NULL
          CONSTRAINT glider_members_role CHECK (role IN ('owner', 'builder', 'pilot', 'reader')),
        PRIMARY KEY (glider_id, user_id),
        CONSTRAINT glider_members_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE,
        CONSTRAINT glider_members_owner CHECK ((role = 'owner') = (user_id = owner_id))
      );
      CREATE INDEX glider_members_user_id ON glider_members (user_id);

      -- A material in use is never lost: plans hold copies, and yet the row they came from stays.
      CREATE TABLE glider_materials (
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        material_id uuid NOT NULL
          CONSTRAINT glider_materials_material REFERENCES materials ON DELETE RESTRICT,
        PRIMARY KEY (glider_id, material_id),
        CONSTRAINT glider_materials_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE
      );
      CREATE INDEX glider_materials_material_id ON glider_materials (material_id);

      CREATE TABLE glider_saves (
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        version integer NOT NULL CONSTRAINT glider_saves_version CHECK (version >= 1),
        plan jsonb NOT NULL CONSTRAINT glider_saves_plan_object CHECK (jsonb_typeof(plan) = 'object'),
        mass_g double precision NOT NULL,
        percent_mac double precision,
        wing_loading_g_dm2 double precision,
        saved_by uuid NOT NULL CONSTRAINT glider_saves_saved_by REFERENCES users ON DELETE RESTRICT,
        saved_at timestamptz(3) NOT NULL DEFAULT now(),
        PRIMARY KEY (glider_id, version),
        CONSTRAINT glider_saves_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE
      );
    `),
  down: (sql) => sql('DROP TABLE glider_saves, glider_materials, glider_members, gliders'),
};
