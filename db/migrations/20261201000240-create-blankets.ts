import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * A plan is of type json, not jsonb: it keeps the order of stitches, on which the last digit of a
 * sum depends. A deleted blanket stays until it is restored or its owner's account goes.
 */
const UP = `
  CREATE TABLE blankets (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    title text NOT NULL CHECK (length(title) BETWEEN 1 AND 120),
    plan json NOT NULL CHECK (json_typeof(plan) = 'object'),
    schema_version integer NOT NULL CHECK (schema_version >= 1),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    deleted_at timestamptz,
    CONSTRAINT blankets_with_owner UNIQUE (id, owner_id)
  );
  -- A person's blankets, last changed first.
  CREATE INDEX blankets_of_owner_by_age ON blankets (owner_id, updated_at DESC);

  CREATE TABLE blanket_revisions (
    blanket_id uuid NOT NULL REFERENCES blankets (id) ON DELETE CASCADE,
    version integer NOT NULL CHECK (version >= 1),
    title text NOT NULL CHECK (length(title) BETWEEN 1 AND 120),
    plan json NOT NULL CHECK (json_typeof(plan) = 'object'),
    schema_version integer NOT NULL CHECK (schema_version >= 1),
    saved_at timestamptz NOT NULL,
    PRIMARY KEY (blanket_id, version)
  );

  -- Which colourway of the stash serves a colour; null when none may, although a name matches.
  CREATE TABLE blanket_colour_links (
    blanket_id uuid NOT NULL,
    owner_id uuid NOT NULL,
    colour_key text NOT NULL CHECK (length(colour_key) BETWEEN 1 AND 80),
    colourway_id uuid,
    PRIMARY KEY (blanket_id, colour_key),
    CONSTRAINT blanket_colour_links_of_own_blanket
      FOREIGN KEY (blanket_id, owner_id) REFERENCES blankets (id, owner_id) ON DELETE CASCADE,
    CONSTRAINT blanket_colour_links_of_own_colourway
      FOREIGN KEY (colourway_id, owner_id) REFERENCES colourways (id, owner_id) ON DELETE CASCADE
  );
  -- Deleting a colourway looks for its links.
  CREATE INDEX blanket_colour_links_of_colourway ON blanket_colour_links (colourway_id);
`;

const DOWN = 'DROP TABLE blanket_colour_links, blanket_revisions, blankets;';
