import type { Migration } from './migration.ts';

/**
 * Clubs with their members, what members show each other, and the limits of classes by edition: those of nobody's
 * club are everybody's. An edition that something was measured against or is aimed at never changes again.
 */
export const clubs: Migration = {
  name: '20261201-11-clubs',
  up: (sql) =>
    sql(`
      CREATE TABLE clubs (
        id uuid PRIMARY KEY,
        name text NOT NULL CONSTRAINT clubs_name_length CHECK (char_length(name) BETWEEN 1 AND 120),
        place text NOT NULL DEFAULT '' CONSTRAINT clubs_place_length CHECK (char_length(place) <= 120),
        version integer NOT NULL DEFAULT 1 CONSTRAINT clubs_version CHECK (version >= 1),
        founded_by uuid CONSTRAINT clubs_founded_by REFERENCES users ON DELETE SET NULL,
        created_at timestamptz(3) NOT NULL DEFAULT now()
      );

      CREATE TABLE club_members (
        club_id uuid NOT NULL CONSTRAINT club_members_club REFERENCES clubs ON DELETE CASCADE,
        user_id uuid NOT NULL CONSTRAINT club_members_user REFERENCES users ON DELETE CASCADE,
        role text NOT NULL CONSTRAINT club_members_role CHECK (role IN ('secretary', 'director', 'member')),
        joined_at timestamptz(3) NOT NULL DEFAULT now(),
        PRIMARY KEY (club_id, user_id)
      );
      CREATE INDEX club_members_user_id ON club_members (user_id);

      CREATE TABLE club_invitations (
        id uuid PRIMARY KEY,
        club_id uuid NOT NULL CONSTRAINT club_invitations_club REFERENCES clubs ON DELETE CASCADE,
        email text NOT NULL
          CONSTRAINT club_invitations_email CHECK (email = lower(email) AND char_length(email) <= 254),
        role text NOT NULL CONSTRAINT club_invitations_role CHECK (role IN ('secretary', 'director', 'member')),
        token_hash text NOT NULL
          CONSTRAINT club_invitations_token_hash_key UNIQUE
          CONSTRAINT club_invitations_hashed CHECK (token_hash ~ '^[0-9a-f]{64}$'),
        invited_by uuid NOT NULL CONSTRAINT club_invitations_invited_by REFERENCES users ON DELETE CASCADE,
        invited_at timestamptz(3) NOT NULL DEFAULT now(),
        expires_at timestamptz(3) NOT NULL,
        CONSTRAINT club_invitations_club_id_email_key UNIQUE (club_id, email)
      );

      -- Gliders that their owner lets the whole club see.
      CREATE TABLE club_gliders (
        club_id uuid NOT NULL CONSTRAINT club_gliders_club REFERENCES clubs ON DELETE CASCADE,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        shared_at timestamptz(3) NOT NULL DEFAULT now(),
        PRIMARY KEY (club_id, glider_id),
        CONSTRAINT club_gliders_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );
      CREATE INDEX club_gliders_glider_id ON club_gliders (glider_id);

      CREATE TABLE class_editions (
        id uuid PRIMARY KEY,
        club_id uuid CONSTRAINT class_editions_club REFERENCES clubs ON DELETE CASCADE,
        key text NOT NULL CONSTRAINT class_editions_key CHECK (key ~ '^[A-Za-z0-9-]{1,64}$'),
        name text NOT NULL CONSTRAINT class_editions_name_length CHECK (char_length(name) BETWEEN 1 AND 120),
        issued_by text NOT NULL
          CONSTRAINT class_editions_issued_by_length CHECK (char_length(issued_by) BETWEEN 1 AND 120),
        edition text NOT NULL
          CONSTRAINT class_editions_edition_length CHECK (char_length(edition) BETWEEN 1 AND 120),
        note text NOT NULL DEFAULT '' CONSTRAINT class_editions_note_length CHECK (char_length(note) <= 2000),
        limits jsonb NOT NULL CONSTRAINT class_editions_limits_array CHECK (jsonb_typeof(limits) = 'array'),
        version integer NOT NULL DEFAULT 1 CONSTRAINT class_editions_version CHECK (version >= 1),
        added_at timestamptz(3) NOT NULL DEFAULT now(),
        used_at timestamptz(3),
        CONSTRAINT class_editions_club_id_key_edition_key UNIQUE NULLS NOT DISTINCT (club_id, key, edition)
      );
      CREATE FUNCTION refuse_change_of_used() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        IF OLD.used_at IS NULL THEN
          RETURN CASE TG_OP WHEN 'DELETE' THEN OLD ELSE NEW END;
        END IF;
        IF TG_OP = 'DELETE' THEN
          -- The club is gone already when its rows follow by cascade.
          IF OLD.club_id IS NOT NULL AND NOT EXISTS (SELECT FROM clubs WHERE id = OLD.club_id) THEN
            RETURN OLD;
          END IF;
        ELSIF to_jsonb(NEW) = to_jsonb(OLD) THEN
          RETURN NEW;
        END IF;
        RAISE EXCEPTION 'an edition in use never changes' USING ERRCODE = 'restrict_violation';
      END $$;
      CREATE TRIGGER class_editions_used BEFORE UPDATE OR DELETE ON class_editions
        FOR EACH ROW EXECUTE FUNCTION refuse_change_of_used();

      -- The class that a glider is built for.
      CREATE TABLE glider_aims (
        owner_id uuid NOT NULL,
        glider_id uuid PRIMARY KEY,
        class_edition_id uuid NOT NULL
          CONSTRAINT glider_aims_class_edition REFERENCES class_editions ON DELETE CASCADE,
        aimed_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT glider_aims_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );
      CREATE INDEX glider_aims_class_edition_id ON glider_aims (class_edition_id);
    `),
  down: (sql) =>
    sql(`
      DROP TABLE glider_aims, class_editions, club_gliders, club_invitations, club_members, clubs;
      DROP FUNCTION refuse_change_of_used;
    `),
};
