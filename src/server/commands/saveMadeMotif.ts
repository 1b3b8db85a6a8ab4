import type { Transaction } from 'sequelize';
import { Swatch } from '../../../db/models';
import type { MadeMotifInput } from '../../schemas/madeMotif';
import type { CurrentUser } from '../../schemas/user';
import { invalid } from '../parseParts';
import { owns } from '../policies/own';
import { orNull } from '../queries/own';
import { getMotif } from '../queries/motifs';

export function madeMotifColumns({ putUp, weighed, ...made }: MadeMotifInput) {
  return {
    ...made,
    putUpMassG: putUp?.massG ?? null,
    putUpLengthM: putUp?.lengthM ?? null,
    weighedCount: weighed?.count ?? null,
    weighedMassG: weighed?.massG ?? null,
    weighedResolutionG: weighed?.resolutionG ?? null,
    weighedYarns: weighed?.yarns ?? null,
  };
}

/** The motif must be there, and as it is now have the rounds that were worked of it. */
export async function requireMotif(
  user: CurrentUser,
  { motifKey, motifVersion, rounds }: MadeMotifInput,
  transaction: Transaction,
): Promise<void> {
  const found = await orNull(getMotif(user, motifKey, transaction));
  if (!found) throw invalid({ motifKey: 'You have no such motif' });
  const most = found.motif?.rounds.length ?? 0;
  if (found.version === motifVersion && rounds > most) {
    throw invalid({ rounds: `This motif has only ${most} rounds` });
  }
}

export async function requireOwnSwatch(
  user: CurrentUser,
  swatchId: string | null,
  transaction: Transaction,
): Promise<void> {
  if (swatchId === null) return;
  const swatch = await Swatch.findByPk(swatchId, { transaction });
  if (!swatch || !owns(user, swatch)) throw invalid({ swatchId: 'You have no such swatch' });
}
