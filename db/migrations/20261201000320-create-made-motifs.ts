import type { QueryInterface } from 'sequelize';

export const up = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(UP, { transaction }));

export const down = ({ context: { sequelize } }: { context: QueryInterface }) =>
  sequelize.transaction((transaction) => sequelize.query(DOWN, { transaction }));

/**
 * Motifs that were made and measured. They outlive their swatch, and their motif: the key is that of
 * a ready-made one or the id of one's own, so it can have no foreign key.
 */
const UP = `
  ALTER TABLE swatches ADD CONSTRAINT swatches_with_owner UNIQUE (id, owner_id);

  CREATE TABLE made_motifs (
    id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
    owner_id uuid NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    motif_key text NOT NULL CHECK (length(motif_key) BETWEEN 1 AND 80),
    motif_version integer CHECK (motif_version >= 1),
    made_on date NOT NULL,
    rounds integer NOT NULL CHECK (rounds BETWEEN 1 AND 60),
    swatch_id uuid,
    weight_category integer NOT NULL CHECK (weight_category BETWEEN 0 AND 7),
    put_up_mass_g double precision CHECK (put_up_mass_g > 0 AND put_up_mass_g <= 10000),
    put_up_length_m double precision CHECK (put_up_length_m > 0 AND put_up_length_m <= 100000),
    sizes json NOT NULL CHECK (json_typeof(sizes) = 'array'),
    weighed_count integer CHECK (weighed_count BETWEEN 1 AND 10000),
    weighed_mass_g double precision CHECK (weighed_mass_g > 0 AND weighed_mass_g <= 100000),
    weighed_resolution_g double precision
      CHECK (weighed_resolution_g > 0 AND weighed_resolution_g <= 10000),
    weighed_yarns integer CHECK (weighed_yarns BETWEEN 1 AND 60),
    blocked boolean NOT NULL,
    notes text NOT NULL DEFAULT '' CHECK (length(notes) <= 4000),
    version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
    created_at timestamptz NOT NULL DEFAULT now(),
    updated_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT made_motifs_of_own_swatch
      FOREIGN KEY (swatch_id, owner_id) REFERENCES swatches (id, owner_id)
      ON DELETE SET NULL (swatch_id),
    CONSTRAINT made_motifs_put_up_whole CHECK (num_nonnulls(put_up_mass_g, put_up_length_m) IN (0, 2)),
    CONSTRAINT made_motifs_weight_whole CHECK (
      num_nonnulls(weighed_count, weighed_mass_g, weighed_resolution_g, weighed_yarns) IN (0, 4)
    ),
    CONSTRAINT made_motifs_weight_in_metres CHECK (weighed_mass_g IS NULL OR put_up_mass_g IS NOT NULL),
    CONSTRAINT made_motifs_measured CHECK (weighed_mass_g IS NOT NULL OR json_array_length(sizes) > 0)
  );
  -- A person's made ones of a motif, newest first.
  CREATE INDEX made_motifs_of_owner_by_motif ON made_motifs (owner_id, motif_key, made_on DESC);
  -- Deleting a swatch looks for what was compared with it.
  CREATE INDEX made_motifs_of_swatch ON made_motifs (swatch_id);
`;

const DOWN = `
  DROP TABLE made_motifs;
  ALTER TABLE swatches DROP CONSTRAINT swatches_with_owner;
`;
