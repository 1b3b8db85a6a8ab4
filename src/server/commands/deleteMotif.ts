import type { Transaction } from 'sequelize';
import { MadeMotifRow, MotifRow } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

/** What was measured of it goes along: it could not be reached any more. Blankets keep its rounds. */
export async function deleteMotif(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  const row = await lockOwn(MotifRow, user, id, transaction);
  await MadeMotifRow.destroy({ where: { ownerId: user.id, motifKey: row.id }, transaction });
  await row.destroy({ transaction });
}
