import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * A motif of one's own becomes its pattern text; ring and rounds are what the reader made of it when
 * it was saved, so that a list need not read every text again. Motifs kept before had counted rounds
 * and no text: they keep their rounds until a text is saved for them.
 */
const UP = `
  ALTER TABLE motifs
    ADD COLUMN text text NOT NULL DEFAULT '' CHECK (length(text) <= 50000),
    ADD COLUMN terms text NOT NULL DEFAULT 'us' CHECK (terms IN ('us', 'uk')),
    ADD COLUMN size integer NOT NULL DEFAULT 0 CHECK (size BETWEEN 0 AND 19),
    ADD COLUMN stitches json NOT NULL DEFAULT '[]' CHECK (json_typeof(stitches) = 'array'),
    ADD COLUMN errors integer NOT NULL DEFAULT 0 CHECK (errors >= 0),
    ADD COLUMN warnings integer NOT NULL DEFAULT 0 CHECK (warnings >= 0),
    DROP CONSTRAINT motifs_has_rounds,
    ADD CONSTRAINT motifs_has_no_more_rounds CHECK (json_array_length(rounds) <= 60);

  CREATE TABLE motif_versions (
    motif_id uuid NOT NULL REFERENCES motifs (id) ON DELETE CASCADE,
    version integer NOT NULL CHECK (version >= 1),
    name text NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    text text NOT NULL CHECK (length(text) <= 50000),
    terms text NOT NULL CHECK (terms IN ('us', 'uk')),
    sides integer NOT NULL CHECK (sides IN (0, 3, 4, 6, 8)),
    size integer NOT NULL CHECK (size BETWEEN 0 AND 19),
    stitches json NOT NULL CHECK (json_typeof(stitches) = 'array'),
    ring json NOT NULL CHECK (json_typeof(ring) = 'object'),
    rounds json NOT NULL CHECK (json_typeof(rounds) = 'array'),
    errors integer NOT NULL CHECK (errors >= 0),
    warnings integer NOT NULL CHECK (warnings >= 0),
    saved_at timestamptz NOT NULL,
    PRIMARY KEY (motif_id, version)
  );
  INSERT INTO motif_versions
    SELECT id, version, name, text, terms, sides, size, stitches, ring, rounds, errors, warnings, updated_at
    FROM motifs;
`;

/** Motifs without a worked round cannot be kept as rounds, and the texts go: take a copy first. */
const DOWN = `
  DROP TABLE motif_versions;
  DELETE FROM motifs WHERE json_array_length(rounds) = 0;
  ALTER TABLE motifs
    DROP CONSTRAINT motifs_has_no_more_rounds,
    ADD CONSTRAINT motifs_has_rounds CHECK (json_array_length(rounds) BETWEEN 1 AND 60),
    DROP COLUMN text,
    DROP COLUMN terms,
    DROP COLUMN size,
    DROP COLUMN stitches,
    DROP COLUMN errors,
    DROP COLUMN warnings;
`;
