import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/** A swatch outlives its yarn: what it says about a maker's hand stays true. */
const UP = `
  CREATE TABLE swatches (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    yarn_id uuid,
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    stitch text NOT NULL CHECK (length(stitch) BETWEEN 1 AND 80),
    stitches integer NOT NULL CHECK (stitches BETWEEN 1 AND 1000),
    rows integer NOT NULL CHECK (rows BETWEEN 1 AND 1000),
    hook_mm double precision CHECK (hook_mm > 0 AND hook_mm <= 50),
    notes text NOT NULL DEFAULT '' CHECK (length(notes) <= 4000),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT swatches_of_own_yarn
      FOREIGN KEY (yarn_id, owner_id) REFERENCES yarns (id, owner_id) ON DELETE SET NULL (yarn_id)
  );
  -- A person's swatches, newest first.
  CREATE INDEX swatches_of_owner_by_age ON swatches (owner_id, updated_at DESC);
  -- Deleting a yarn looks for its swatches.
  CREATE INDEX swatches_of_yarn ON swatches (yarn_id);

  CREATE TABLE swatch_measurements (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    swatch_id uuid NOT NULL REFERENCES swatches (id) ON DELETE CASCADE,
    position integer NOT NULL CHECK (position >= 0),
    measured_on date NOT NULL,
    kind text NOT NULL,
    width_mm double precision CHECK (width_mm > 0 AND width_mm <= 5000),
    height_mm double precision CHECK (height_mm > 0 AND height_mm <= 5000),
    blocked boolean,
    mass_g double precision CHECK (mass_g > 0 AND mass_g <= 100000),
    resolution_g double precision CHECK (resolution_g > 0 AND resolution_g <= 10000),
    length_m double precision CHECK (length_m > 0 AND length_m <= 1000000),
    error_m double precision CHECK (error_m >= 0 AND error_m <= 1000000),
    CONSTRAINT swatch_measurements_in_order UNIQUE (swatch_id, position),
    CONSTRAINT swatch_measurements_of_kind CHECK (
      CASE kind
        WHEN 'size' THEN num_nonnulls(width_mm, height_mm, blocked) = 3
          AND num_nonnulls(mass_g, resolution_g, length_m, error_m) = 0
        WHEN 'weight' THEN num_nonnulls(mass_g, resolution_g) = 2
          AND num_nonnulls(width_mm, height_mm, blocked, length_m, error_m) = 0
        WHEN 'length' THEN num_nonnulls(length_m, error_m) = 2
          AND num_nonnulls(width_mm, height_mm, blocked, mass_g, resolution_g) = 0
        ELSE false
      END
    )
  );
`;

const DOWN = 'DROP TABLE swatch_measurements, swatches;';
