import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/** What was to be bought on the day a list was kept; it outlives the blanket it was made for. */
const UP = `
  CREATE TABLE shopping_lists (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    blanket_id uuid,
    title text NOT NULL CHECK (length(title) BETWEEN 1 AND 120),
    yarn_name text NOT NULL CHECK (length(yarn_name) BETWEEN 1 AND 80),
    currency text CHECK (currency ~ '^[A-Z]{3}$'),
    confidence double precision NOT NULL CHECK (confidence > 0 AND confidence < 1),
    lines json NOT NULL CHECK (json_typeof(lines) = 'array'),
    bought json NOT NULL DEFAULT '[]' CHECK (json_typeof(bought) = 'array'),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT shopping_lists_of_own_blanket
      FOREIGN KEY (blanket_id, owner_id) REFERENCES blankets (id, owner_id) ON DELETE SET NULL (blanket_id)
  );
  -- A person's lists, newest first.
  CREATE INDEX shopping_lists_of_owner_by_age ON shopping_lists (owner_id, created_at DESC);
  -- Deleting a blanket looks for its lists.
  CREATE INDEX shopping_lists_of_blanket ON shopping_lists (blanket_id);
`;

const DOWN = 'DROP TABLE shopping_lists;';
