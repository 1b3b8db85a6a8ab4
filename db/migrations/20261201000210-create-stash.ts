import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * A colourway that is in the stash cannot be deleted (NO ACTION rather than RESTRICT, so that
 * deleting a whole account, where both rows go in one statement, still works).
 */
const UP = `
  CREATE TABLE dye_lots (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    colourway_id uuid NOT NULL,
    lot_code text NOT NULL DEFAULT '' CHECK (length(lot_code) <= 40),
    location text NOT NULL DEFAULT '' CHECK (length(location) <= 80),
    price_paid_minor integer CHECK (price_paid_minor BETWEEN 0 AND 1000000000),
    currency text CHECK (currency ~ '^[A-Z]{3}$'),
    whole_skeins integer NOT NULL CHECK (whole_skeins BETWEEN 0 AND 100000),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT dye_lots_price_has_currency CHECK ((price_paid_minor IS NULL) = (currency IS NULL)),
    CONSTRAINT dye_lots_code_once_per_colourway UNIQUE (colourway_id, lot_code),
    CONSTRAINT dye_lots_of_own_colourway
      FOREIGN KEY (colourway_id, owner_id) REFERENCES colourways (id, owner_id) ON DELETE NO ACTION
  );
  -- A person's whole stash.
  CREATE INDEX dye_lots_of_owner ON dye_lots (owner_id);

  CREATE TABLE part_skeins (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    dye_lot_id uuid NOT NULL REFERENCES dye_lots (id) ON DELETE CASCADE,
    position integer NOT NULL CHECK (position >= 0),
    mass_g double precision NOT NULL CHECK (mass_g > 0 AND mass_g <= 10000),
    CONSTRAINT part_skeins_in_order UNIQUE (dye_lot_id, position)
  );
`;

const DOWN = 'DROP TABLE part_skeins, dye_lots;';
