import type { MotifRow } from '../../../db/models';
import type { Motif } from '../../lib/motifs/motif';
import { motifSchema, type PresentedMotif } from '../../schemas/motif';

/** A motif of one's own; its key in a plan is its id. */
export function presentOwnMotif(row: MotifRow): PresentedMotif {
  const { id: key, name, sides, ring, rounds } = row;
  return {
    key,
    readyMade: false,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    motif: { key, version: row.version, name, sides, ring, rounds },
  };
}

export function presentReadyMotif(motif: Motif): PresentedMotif {
  return {
    key: motif.key,
    readyMade: true,
    version: null,
    updatedAt: null,
    motif: motifSchema.parse(motif),
  };
}
