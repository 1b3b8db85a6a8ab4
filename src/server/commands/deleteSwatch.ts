import type { Transaction } from 'sequelize';
import { Swatch } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteSwatch(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(Swatch, user, id, transaction)).destroy({ transaction });
}
