import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * One's own motifs; the ready-made ones belong to the program. Of type json, not jsonb: it keeps
 * the order of stitches, on which the last digit of a sum depends.
 */
const UP = `
  CREATE TABLE motifs (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    sides integer NOT NULL CHECK (sides IN (0, 3, 4, 6, 8)),
    ring json NOT NULL CHECK (json_typeof(ring) = 'object'),
    rounds json NOT NULL CHECK (json_typeof(rounds) = 'array'),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT motifs_has_rounds CHECK (json_array_length(rounds) BETWEEN 1 AND 60)
  );
  -- A person's motifs in the order of their list.
  CREATE INDEX motifs_of_owner_by_name ON motifs (owner_id, lower(name), id);
`;

const DOWN = 'DROP TABLE motifs;';
