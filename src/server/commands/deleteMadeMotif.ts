import type { Transaction } from 'sequelize';
import { MadeMotifRow } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteMadeMotif(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(MadeMotifRow, user, id, transaction)).destroy({ transaction });
}
