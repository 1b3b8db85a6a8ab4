import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/** A stitch of one's own by its moves. The unique constraint also serves the list in the order of the alphabet. */
const UP = `
  CREATE TABLE own_stitches (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    abbreviation text NOT NULL CHECK (abbreviation ~ '^[a-z]{2,12}$'),
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    wraps integer NOT NULL CHECK (wraps BETWEEN 0 AND 20),
    draws integer NOT NULL CHECK (draws BETWEEN 0 AND 20),
    throughs integer NOT NULL CHECK (throughs BETWEEN 0 AND 60),
    height_over_width double precision CHECK (height_over_width BETWEEN 0.05 AND 20),
    takes integer NOT NULL CHECK (takes BETWEEN 0 AND 20),
    symbol json CHECK (json_typeof(symbol) = 'object'),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT own_stitches_made_by_hand CHECK (draws + throughs > 0),
    CONSTRAINT own_stitches_once_by_abbreviation UNIQUE (owner_id, abbreviation)
  );
`;

const DOWN = 'DROP TABLE own_stitches;';
