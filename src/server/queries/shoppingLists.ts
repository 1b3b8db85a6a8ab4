import type { Transaction } from 'sequelize';
import { ShoppingList } from '../../../db/models';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { KeptShoppingList } from '../../schemas/shoppingList';
import type { CurrentUser } from '../../schemas/user';
import { presentShoppingList } from '../presenters/shoppingList';
import { loadOwn } from './own';

const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.shoppingLists, offset: 0 };

/** The shopping lists one has kept, newest first. */
export async function listShoppingLists(
  user: CurrentUser,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: KeptShoppingList[]; total: number }> {
  const where = { ownerId: user.id };
  const [rows, total] = await Promise.all([
    ShoppingList.findAll({ where, order: [['createdAt', 'DESC'], 'id'], limit, offset }),
    ShoppingList.count({ where }),
  ]);
  return { items: rows.map(presentShoppingList), total };
}

export async function getShoppingList(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<KeptShoppingList> {
  return presentShoppingList(await loadOwn(ShoppingList, user, id, { transaction }));
}
