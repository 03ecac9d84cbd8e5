import type { Knex } from 'knex';

/** Passages, their waypoints, winds and streams, and the checks made of them. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE passages (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      boat_id uuid NOT NULL REFERENCES boats ON DELETE RESTRICT,
      name text NOT NULL CHECK (length(btrim(name)) BETWEEN 1 AND 120),
      zone text NOT NULL CHECK (length(zone) BETWEEN 1 AND 64),
      departure timestamptz NOT NULL,
      limits jsonb NOT NULL DEFAULT '{}' CHECK (jsonb_typeof(limits) = 'object'),
      revision integer NOT NULL DEFAULT 1 CHECK (revision >= 1),
      created_by uuid NOT NULL REFERENCES users ON DELETE RESTRICT,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      hidden_at timestamptz,
      hidden_by uuid REFERENCES users ON DELETE RESTRICT,
      CHECK ((hidden_at IS NULL) = (hidden_by IS NULL))
    );
    CREATE INDEX passages_boat ON passages (boat_id, departure DESC);

    CREATE TABLE waypoints (
      passage_id uuid NOT NULL REFERENCES passages ON DELETE CASCADE,
      position smallint NOT NULL CHECK (position >= 0),
      name text NOT NULL CHECK (length(btrim(name)) BETWEEN 1 AND 80),
      lat double precision NOT NULL CONSTRAINT waypoints_lat CHECK (lat BETWEEN -85 AND 85),
      lon double precision NOT NULL CONSTRAINT waypoints_lon CHECK (lon BETWEEN -180 AND 180),
      corridor_half_width_m double precision NOT NULL
        CONSTRAINT waypoints_corridor CHECK (corridor_half_width_m BETWEEN 10 AND 50000),
      PRIMARY KEY (passage_id, position)
    );

    CREATE TABLE forecasts (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      passage_id uuid NOT NULL REFERENCES passages ON DELETE CASCADE,
      number integer NOT NULL CHECK (number >= 1),
      kind text NOT NULL CONSTRAINT forecasts_kind CHECK (kind IN ('typed')),
      source text NOT NULL CHECK (length(btrim(source)) BETWEEN 1 AND 200),
      issued_at timestamptz NOT NULL,
      rows jsonb NOT NULL CONSTRAINT forecasts_rows CHECK (jsonb_typeof(rows) = 'array' AND jsonb_array_length(rows) >= 1),
      entered_by uuid NOT NULL REFERENCES users ON DELETE RESTRICT,
      created_at timestamptz NOT NULL DEFAULT now(),
      UNIQUE (passage_id, number)
    );

    CREATE TABLE passage_streams (
      passage_id uuid PRIMARY KEY REFERENCES passages ON DELETE CASCADE,
      rows jsonb NOT NULL CHECK (jsonb_typeof(rows) = 'array' AND jsonb_array_length(rows) >= 1)
    );

    CREATE TABLE passage_checks (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      passage_id uuid NOT NULL REFERENCES passages ON DELETE RESTRICT,
      passage_revision integer NOT NULL CHECK (passage_revision >= 1),
      boat_sheet_id uuid NOT NULL REFERENCES boat_sheets ON DELETE RESTRICT,
      forecast_id uuid NOT NULL REFERENCES forecasts ON DELETE RESTRICT,
      engine_version text NOT NULL CHECK (length(engine_version) BETWEEN 1 AND 40),
      as_of timestamptz NOT NULL,
      inputs jsonb NOT NULL CHECK (jsonb_typeof(inputs) = 'object'),
      result jsonb NOT NULL CHECK (jsonb_typeof(result) = 'object'),
      state text NOT NULL CONSTRAINT passage_checks_state CHECK (state IN ('within', 'thin', 'beyond', 'unknown')),
      largest_load_share double precision CHECK (largest_load_share >= 0),
      worst_leg_position smallint CHECK (worst_leg_position >= 0),
      checked_by uuid NOT NULL REFERENCES users ON DELETE RESTRICT,
      created_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE INDEX passage_checks_passage ON passage_checks (passage_id, passage_revision DESC, created_at DESC);
    CREATE INDEX passage_checks_sheet ON passage_checks (boat_sheet_id);
    CREATE INDEX passage_checks_forecast ON passage_checks (forecast_id);
    CREATE TRIGGER passage_checks_immutable BEFORE UPDATE OR DELETE ON passage_checks
      FOR EACH ROW EXECUTE FUNCTION refuse_change();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    DROP TABLE passage_checks;
    DROP TABLE passage_streams;
    DROP TABLE forecasts;
    DROP TABLE waypoints;
    DROP TABLE passages;
  `);
}
