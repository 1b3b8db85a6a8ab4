import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * Rows that belong together carry their owner in the foreign key, so that the database itself
 * refuses to hang one person's colourway on another person's yarn.
 */
const UP = `
  CREATE TABLE yarns (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    maker text NOT NULL DEFAULT '' CHECK (length(maker) <= 80),
    fibre text NOT NULL DEFAULT '' CHECK (length(fibre) <= 200),
    weight_category integer NOT NULL CHECK (weight_category BETWEEN 0 AND 7),
    put_up_mass_g double precision NOT NULL CHECK (put_up_mass_g > 0 AND put_up_mass_g <= 10000),
    put_up_length_m double precision NOT NULL CHECK (put_up_length_m > 0 AND put_up_length_m <= 100000),
    price_minor integer CHECK (price_minor BETWEEN 0 AND 1000000000),
    currency text CHECK (currency ~ '^[A-Z]{3}$'),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT yarns_price_has_currency CHECK ((price_minor IS NULL) = (currency IS NULL)),
    CONSTRAINT yarns_with_owner UNIQUE (id, owner_id)
  );
  -- A person's yarns in the order of their list.
  CREATE INDEX yarns_of_owner_by_name ON yarns (owner_id, lower(name), id);

  CREATE TABLE colourways (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL,
    yarn_id uuid NOT NULL,
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    hex text NOT NULL CHECK (hex ~ '^#[0-9a-f]{6}$'),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT colourways_with_owner UNIQUE (id, owner_id),
    CONSTRAINT colourways_of_own_yarn
      FOREIGN KEY (yarn_id, owner_id) REFERENCES yarns (id, owner_id) ON DELETE CASCADE
  );
  CREATE UNIQUE INDEX colourways_name_once_per_yarn ON colourways (yarn_id, lower(name));
  -- A blanket's colours are matched with all colourways of its owner by name.
  CREATE INDEX colourways_of_owner_by_name ON colourways (owner_id, lower(name));
`;

const DOWN = 'DROP TABLE colourways, yarns;';
