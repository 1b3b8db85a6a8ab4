import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * How far a blanket is made. Every mark carries the moment it was made on a device, so that marks
 * of several devices, some of them long offline, come together in any order: the later one counts.
 */
const UP = `
  ALTER TABLE blankets
    ADD COLUMN making_order text NOT NULL DEFAULT 'row-by-row'
      CHECK (making_order IN ('row-by-row', 'in-columns', 'outwards', 'continuous')),
    ADD COLUMN making_order_at timestamptz;

  CREATE TABLE making_ticks (
    blanket_id uuid NOT NULL REFERENCES blankets (id) ON DELETE CASCADE,
    motif text NOT NULL CHECK (motif ~ '^[ms][0-9]{1,4}:[0-9]{1,4}$'),
    done boolean NOT NULL,
    at timestamptz NOT NULL,
    PRIMARY KEY (blanket_id, motif)
  );

  CREATE TABLE making_weighings (
    id uuid NOT NULL,
    blanket_id uuid NOT NULL REFERENCES blankets (id) ON DELETE CASCADE,
    colour text NOT NULL CHECK (length(colour) BETWEEN 1 AND 80),
    left_g double precision NOT NULL CHECK (left_g >= 0 AND left_g <= 100000),
    resolution_g double precision NOT NULL CHECK (resolution_g > 0 AND resolution_g <= 10000),
    made json NOT NULL CHECK (json_typeof(made) = 'object'),
    tails integer NOT NULL CHECK (tails BETWEEN 0 AND 100000),
    gone boolean NOT NULL,
    at timestamptz NOT NULL,
    PRIMARY KEY (blanket_id, id)
  );
`;

const DOWN = `
  DROP TABLE making_weighings;
  DROP TABLE making_ticks;
  ALTER TABLE blankets DROP COLUMN making_order_at, DROP COLUMN making_order;
`;
