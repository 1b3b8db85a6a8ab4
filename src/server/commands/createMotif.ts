import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { MotifInput, PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnMotif } from '../presenters/motif';
import { requireRoom } from './requireRoom';

export async function createMotif(
  user: CurrentUser,
  { name, sides, ring, rounds }: MotifInput,
  transaction: Transaction,
): Promise<PresentedMotif> {
  await requireRoom(MotifRow, user, KEPT_LIMITS.motifs, 'motifs', transaction);
  return presentOwnMotif(
    await MotifRow.create({ ownerId: user.id, name, sides, ring, rounds }, { transaction }),
  );
}
