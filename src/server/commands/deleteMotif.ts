import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteMotif(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(MotifRow, user, id, transaction)).destroy({ transaction });
}
