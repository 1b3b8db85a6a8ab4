import type { Transaction } from 'sequelize';
import { DyeLot } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteLot(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(DyeLot, user, id, transaction)).destroy({ transaction });
}
