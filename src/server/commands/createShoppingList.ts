import type { Transaction } from 'sequelize';
import { Blanket, ShoppingList } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { KeptShoppingList } from '../../schemas/shoppingList';
import type { CurrentUser } from '../../schemas/user';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';
import { presentShoppingList } from '../presenters/shoppingList';
import { getBlanketShopping } from '../queries/blanketShopping';
import { requireRoom } from './requireRoom';

/** Keeps what a blanket needs as things are now, to be ticked off in the shop. */
export async function createShoppingList(
  user: CurrentUser,
  blanketId: string,
  transaction: Transaction,
): Promise<KeptShoppingList> {
  await requireRoom(ShoppingList, user, KEPT_LIMITS.shoppingLists, 'shopping lists', transaction);
  const blanket = await Blanket.findByPk(blanketId, { transaction });
  if (!blanket || !owns(user, blanket)) throw invalid({ blanketId: 'You have no such blanket' });
  const { title, yarnName, currency, confidence, lines } = await getBlanketShopping(
    user,
    blanketId,
    transaction,
  );
  const row = await ShoppingList.create(
    { ownerId: user.id, blanketId, title, yarnName, currency, confidence, lines, bought: [] },
    { transaction },
  );
  return presentShoppingList(row);
}
