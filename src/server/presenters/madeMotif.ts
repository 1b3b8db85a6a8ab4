import type { MadeMotifRow } from '../../../db/models';
import type { PresentedMadeMotif } from '../../schemas/madeMotif';

export function presentMadeMotif(row: MadeMotifRow): PresentedMadeMotif {
  return {
    id: row.id,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    motifKey: row.motifKey,
    motifVersion: row.motifVersion,
    madeOn: row.madeOn,
    rounds: row.rounds,
    swatchId: row.swatchId,
    weightCategory: row.weightCategory,
    putUp: putUpOf(row),
    sizes: row.sizes,
    weighed: weightOf(row),
    blocked: row.blocked,
    notes: row.notes,
  };
}

function putUpOf({ putUpMassG, putUpLengthM }: MadeMotifRow): PresentedMadeMotif['putUp'] {
  return putUpMassG === null || putUpLengthM === null
    ? null
    : { massG: putUpMassG, lengthM: putUpLengthM };
}

function weightOf(row: MadeMotifRow): PresentedMadeMotif['weighed'] {
  const { weighedCount, weighedMassG, weighedResolutionG, weighedYarns } = row;
  return weighedCount === null ||
    weighedMassG === null ||
    weighedResolutionG === null ||
    weighedYarns === null
    ? null
    : {
        count: weighedCount,
        massG: weighedMassG,
        resolutionG: weighedResolutionG,
        yarns: weighedYarns,
      };
}
