import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { MotifInput, PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnMotif } from '../presenters/motif';
import { requireRoom } from './requireRoom';
import { keepMotifVersion, motifColumns } from './saveMotif';

export async function createMotif(
  user: CurrentUser,
  input: MotifInput,
  transaction: Transaction,
): Promise<PresentedMotif> {
  await requireRoom(MotifRow, user, KEPT_LIMITS.motifs, 'motifs', transaction);
  const columns = { ownerId: user.id, ...motifColumns(input) };
  const row = await MotifRow.create(columns, { transaction });
  await keepMotifVersion(row, transaction);
  return presentOwnMotif(row);
}
