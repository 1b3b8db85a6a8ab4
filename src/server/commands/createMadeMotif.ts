import type { Transaction } from 'sequelize';
import { MadeMotifRow } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { MadeMotifInput, PresentedMadeMotif } from '../../schemas/madeMotif';
import type { CurrentUser } from '../../schemas/user';
import { presentMadeMotif } from '../presenters/madeMotif';
import { requireRoom } from './requireRoom';
import { madeMotifColumns, requireMotif, requireOwnSwatch } from './saveMadeMotif';

export async function createMadeMotif(
  user: CurrentUser,
  input: MadeMotifInput,
  transaction: Transaction,
): Promise<PresentedMadeMotif> {
  await requireRoom(MadeMotifRow, user, KEPT_LIMITS.madeMotifs, 'made motifs', transaction);
  await requireMotif(user, input, transaction);
  await requireOwnSwatch(user, input.swatchId, transaction);
  const columns = { ownerId: user.id, ...madeMotifColumns(input) };
  return presentMadeMotif(await MadeMotifRow.create(columns, { transaction }));
}
