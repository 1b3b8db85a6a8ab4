import type { Transaction } from 'sequelize';
import { OwnStitchRow } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteOwnStitch(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(OwnStitchRow, user, id, transaction)).destroy({ transaction });
}
