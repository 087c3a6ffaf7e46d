import type { Migration } from './migration.ts';

const OWNED = [
  ['glider_members', 'glider_members_glider'],
  ['glider_materials', 'glider_materials_glider'],
  ['glider_saves', 'glider_saves_glider'],
  ['glider_save_names', 'glider_save_names_glider'],
  ['glider_photos', 'glider_photos_glider'],
  ['sheets', 'sheets_glider'],
];

const refer = (onUpdate: string) =>
  OWNED.map(
    ([table, name]) => `
      ALTER TABLE ${table} DROP CONSTRAINT ${name}, ADD CONSTRAINT ${name}
        FOREIGN KEY (owner_id, glider_id) REFERENCES gliders (owner_id, id) ON DELETE CASCADE ${onUpdate};`,
  ).join('');

/** What a row says beside whose glider it is of never changes; that moves when a glider is handed over. */
const refuse = (moves: string) => `
      CREATE OR REPLACE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        -- The glider is gone already when its rows follow by cascade.
        IF TG_OP = 'DELETE' THEN
          IF NOT EXISTS (SELECT FROM gliders WHERE id = OLD.glider_id) THEN
            RETURN OLD;
          END IF;
        END IF;${moves}
        RAISE EXCEPTION 'rows of % are unchanging', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
      END $$;`;

/** Confirmed addresses, sessions that can be told apart, mailed links, mails, invitations, read-only links. */
export const accounts: Migration = {
  name: '20261201-8-accounts',
  up: (sql) =>
    sql(`
      ALTER TABLE users
        ADD COLUMN verified_at timestamptz(3),
        ADD COLUMN deleted_at timestamptz(3),
        ADD COLUMN preferences jsonb NOT NULL DEFAULT '{"units": {}, "theme": "system"}'
          CONSTRAINT users_preferences_object CHECK (jsonb_typeof(preferences) = 'object');

      ALTER TABLE sessions
        ADD COLUMN id uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT sessions_id_key UNIQUE,
        ADD COLUMN device text NOT NULL DEFAULT ''
          CONSTRAINT sessions_device_length CHECK (char_length(device) <= 120),
        ADD COLUMN last_used_at timestamptz(3) NOT NULL DEFAULT now();

      -- Of a mailed link only the hash is kept; one of a kind for each user, the newest.
      CREATE TABLE mailed_links (
        token_hash text PRIMARY KEY CONSTRAINT mailed_links_hashed CHECK (token_hash ~ '^[0-9a-f]{64}$'),
        user_id uuid NOT NULL CONSTRAINT mailed_links_user REFERENCES users ON DELETE CASCADE,
        purpose text NOT NULL CONSTRAINT mailed_links_purpose CHECK (purpose IN ('verify', 'reset')),
        email text NOT NULL CONSTRAINT mailed_links_email CHECK (char_length(email) BETWEEN 3 AND 254),
        expires_at timestamptz(3) NOT NULL,
        CONSTRAINT mailed_links_user_purpose_key UNIQUE (user_id, purpose)
      );

      -- Written with what they are about, sent afterwards; a row is locked while it is sent.
      CREATE TABLE mails (
        id uuid PRIMARY KEY,
        recipient text NOT NULL CONSTRAINT mails_recipient CHECK (char_length(recipient) BETWEEN 3 AND 254),
        subject text NOT NULL CONSTRAINT mails_subject CHECK (char_length(subject) BETWEEN 1 AND 400),
        body_text text NOT NULL,
        body_html text NOT NULL,
        written_at timestamptz(3) NOT NULL DEFAULT now(),
        due_at timestamptz(3) DEFAULT now(),
        attempts integer NOT NULL DEFAULT 0 CONSTRAINT mails_attempts CHECK (attempts >= 0),
        last_error text,
        sent_at timestamptz(3)
      );
      CREATE INDEX mails_due_at ON mails (due_at) WHERE due_at IS NOT NULL;
      CREATE INDEX mails_written_at ON mails (written_at);

      CREATE TABLE invitations (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL,
        glider_id uuid NOT NULL,
        email text NOT NULL CONSTRAINT invitations_email CHECK (email = lower(email) AND char_length(email) <= 254),
        role text NOT NULL CONSTRAINT invitations_role CHECK (role IN ('builder', 'pilot', 'reader')),
        token_hash text NOT NULL
          CONSTRAINT invitations_token_hash_key UNIQUE
          CONSTRAINT invitations_hashed CHECK (token_hash ~ '^[0-9a-f]{64}$'),
        invited_by uuid NOT NULL CONSTRAINT invitations_invited_by REFERENCES users ON DELETE CASCADE,
        invited_at timestamptz(3) NOT NULL DEFAULT now(),
        expires_at timestamptz(3) NOT NULL,
        CONSTRAINT invitations_glider_id_email_key UNIQUE (glider_id, email),
        CONSTRAINT invitations_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );

      CREATE TABLE read_links (
        owner_id uuid NOT NULL,
        glider_id uuid PRIMARY KEY,
        token text NOT NULL
          CONSTRAINT read_links_token_key UNIQUE
          CONSTRAINT read_links_token CHECK (token ~ '^[A-Za-z0-9_-]{43}$'),
        created_at timestamptz(3) NOT NULL DEFAULT now(),
        CONSTRAINT read_links_glider FOREIGN KEY (owner_id, glider_id)
          REFERENCES gliders (owner_id, id) ON DELETE CASCADE ON UPDATE CASCADE
      );

      -- A glider can be handed over: its rows follow, and who owns it is looked at when all of them have.
      ${refer('ON UPDATE CASCADE')}
      ALTER TABLE glider_members DROP CONSTRAINT glider_members_owner;
      CREATE FUNCTION check_owner() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        IF EXISTS (SELECT FROM glider_members AS member
                   WHERE member.glider_id = NEW.glider_id
                     AND (member.role = 'owner') <> (member.user_id = member.owner_id)) THEN
          RAISE EXCEPTION 'the owner’s row and nobody else’s is the owner’s'
            USING ERRCODE = 'check_violation', CONSTRAINT = 'glider_members_owner';
        END IF;
        RETURN NULL;
      END $$;
      CREATE CONSTRAINT TRIGGER glider_members_owner AFTER INSERT OR UPDATE ON glider_members
        DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION check_owner();
      ${refuse(`
        IF TG_OP = 'UPDATE' THEN
          IF to_jsonb(NEW) - 'owner_id' = to_jsonb(OLD) - 'owner_id'
            AND EXISTS (SELECT FROM gliders WHERE id = NEW.glider_id AND owner_id = NEW.owner_id) THEN
            RETURN NEW;
          END IF;
        END IF;`)}
    `),
  down: (sql) =>
    sql(`
      ${refuse('')}
      DROP TRIGGER glider_members_owner ON glider_members;
      DROP FUNCTION check_owner;
      ALTER TABLE glider_members ADD CONSTRAINT glider_members_owner
        CHECK ((role = 'owner') = (user_id = owner_id));
      ${refer('')}
      DROP TABLE read_links, invitations, mails, mailed_links;
      ALTER TABLE sessions DROP COLUMN id, DROP COLUMN device, DROP COLUMN last_used_at;
      ALTER TABLE users DROP COLUMN verified_at, DROP COLUMN deleted_at, DROP COLUMN preferences;
    `),
};
