import type { Transaction } from 'sequelize';
import { ShoppingList } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

export async function deleteShoppingList(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await (await lockOwn(ShoppingList, user, id, transaction)).destroy({ transaction });
}
