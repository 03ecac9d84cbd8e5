import type { Knex } from 'knex';

/** People, what they prove themselves with, and the record of what was done. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE users (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      email text NOT NULL CONSTRAINT users_email_form CHECK (length(email) <= 254 AND email ~ '^[^@[:space:]]+@[^@[:space:]]+$'),
      name text NOT NULL CONSTRAINT users_name_length CHECK (length(btrim(name)) BETWEEN 1 AND 80),
      password_hash text CONSTRAINT users_password_is_argon2id CHECK (password_hash LIKE '$argon2id$%'),
      session_version integer NOT NULL DEFAULT 1 CHECK (session_version >= 1),
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE UNIQUE INDEX users_email_unique ON users (lower(email));

    CREATE TABLE personal_tokens (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      user_id uuid NOT NULL REFERENCES users ON DELETE CASCADE,
      name text NOT NULL CHECK (length(btrim(name)) BETWEEN 1 AND 60),
      token_hash bytea NOT NULL UNIQUE CHECK (octet_length(token_hash) = 32),
      created_at timestamptz NOT NULL DEFAULT now(),
      last_used_at timestamptz,
      revoked_at timestamptz
    );
    CREATE INDEX personal_tokens_user ON personal_tokens (user_id, created_at);

    CREATE TABLE password_resets (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      user_id uuid NOT NULL REFERENCES users ON DELETE CASCADE,
      token_hash bytea NOT NULL UNIQUE CHECK (octet_length(token_hash) = 32),
      created_at timestamptz NOT NULL DEFAULT now(),
      expires_at timestamptz NOT NULL,
      used_at timestamptz,
      CHECK (expires_at > created_at)
    );
    CREATE INDEX password_resets_user ON password_resets (user_id);

    CREATE TABLE audit_events (
      id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
      at timestamptz NOT NULL DEFAULT now(),
      user_id uuid REFERENCES users ON DELETE SET NULL,
      action text NOT NULL CHECK (action ~ '^[a-z]+(-[a-z]+)*$'),
      subject_id uuid,
      details jsonb NOT NULL DEFAULT '{}' CHECK (jsonb_typeof(details) = 'object')
    );
    CREATE INDEX audit_events_subject ON audit_events (subject_id, at);
    CREATE INDEX audit_events_user ON audit_events (user_id, at);

    CREATE TABLE throttle_points (
      key varchar(255) PRIMARY KEY,
      points integer NOT NULL DEFAULT 0,
      expire bigint
    );
    CREATE INDEX throttle_points_expire ON throttle_points (expire);
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    DROP TABLE throttle_points;
    DROP TABLE audit_events;
    DROP TABLE password_resets;
    DROP TABLE personal_tokens;
    DROP TABLE users;
  `);
}
