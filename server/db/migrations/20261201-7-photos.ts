import type { Migration } from './migration.ts';

/** Photos of a glider, and the files of those that are gone or never came to be. */
export const photos: Migration = {
  name: '20261201-7-photos',
  up: (sql) =>
    sql(`
      CREATE TABLE glider_photos (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        file uuid NOT NULL CONSTRAINT glider_photos_file_key UNIQUE,
        caption text NOT NULL CONSTRAINT glider_photos_caption_length CHECK (char_length(caption) <= 500),
        width_px integer NOT NULL CONSTRAINT glider_photos_width CHECK (width_px BETWEEN 1 AND 2400),
        height_px integer NOT NULL CONSTRAINT glider_photos_height CHECK (height_px BETWEEN 1 AND 2400),
        added_by uuid NOT NULL CONSTRAINT glider_photos_added_by REFERENCES users ON DELETE RESTRICT,
        added_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT glider_photos_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE
      );
      CREATE INDEX glider_photos_newest ON glider_photos (glider_id, added_at, id);

      -- A file is named here before it is written and taken off when its photo is kept: what stays is to be removed.
      CREATE TABLE unused_files (
        key text PRIMARY KEY,
        remove_after timestamptz(3) NOT NULL
      );
      CREATE INDEX unused_files_remove_after ON unused_files (remove_after);

      CREATE FUNCTION give_up_files() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        INSERT INTO unused_files (key, remove_after)
          VALUES ('photos/' || OLD.file || '.jpg', now()), ('photos/' || OLD.file || '.small.jpg', now())
          ON CONFLICT DO NOTHING;
        RETURN OLD;
      END $$;
      CREATE TRIGGER glider_photos_given_up AFTER DELETE ON glider_photos
        FOR EACH ROW EXECUTE FUNCTION give_up_files();
    `),
  down: (sql) =>
    sql(`
      DROP TABLE glider_photos, unused_files;
      DROP FUNCTION give_up_files;
    `),
};
