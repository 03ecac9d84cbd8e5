import type { Knex } from 'knex';

/** Boats, who may do what with them, and the numbered versions of their sheets. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE boats (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      name text NOT NULL CHECK (length(btrim(name)) BETWEEN 1 AND 60),
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      hidden_at timestamptz,
      hidden_by uuid REFERENCES users ON DELETE RESTRICT,
      CHECK ((hidden_at IS NULL) = (hidden_by IS NULL))
    );

    CREATE TABLE boat_members (
      boat_id uuid NOT NULL REFERENCES boats ON DELETE CASCADE,
      user_id uuid NOT NULL REFERENCES users ON DELETE CASCADE,
      role text NOT NULL CONSTRAINT boat_members_role CHECK (role IN ('owner', 'skipper', 'crew')),
      created_at timestamptz NOT NULL DEFAULT now(),
      PRIMARY KEY (boat_id, user_id)
    );
    CREATE INDEX boat_members_user ON boat_members (user_id);

    CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      RAISE EXCEPTION 'Rows of % are never changed or deleted; save a new one.', TG_TABLE_NAME
        USING ERRCODE = 'restrict_violation';
    END $$;

    CREATE TABLE boat_sheets (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      boat_id uuid NOT NULL REFERENCES boats ON DELETE RESTRICT,
      number integer NOT NULL CHECK (number >= 1),
      schema_version smallint NOT NULL CHECK (schema_version >= 1),
      sheet jsonb NOT NULL CHECK (jsonb_typeof(sheet) = 'object'),
      saved_by uuid NOT NULL REFERENCES users ON DELETE RESTRICT,
      created_at timestamptz NOT NULL DEFAULT now(),
      UNIQUE (boat_id, number)
    );
    CREATE INDEX boat_sheets_saved_by ON boat_sheets (saved_by);
    CREATE TRIGGER boat_sheets_immutable BEFORE UPDATE OR DELETE ON boat_sheets
      FOR EACH ROW EXECUTE FUNCTION refuse_change();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    DROP TABLE boat_sheets;
    DROP FUNCTION refuse_change();
    DROP TABLE boat_members;
    DROP TABLE boats;
  `);
}
