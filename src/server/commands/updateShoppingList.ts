import type { Transaction } from 'sequelize';
import { ShoppingList } from '../../../db/models';
import type { KeptShoppingList, ShoppingListUpdate } from '../../schemas/shoppingList';
import type { CurrentUser } from '../../schemas/user';
import { invalid } from '../parseParts';
import { presentShoppingList } from '../presenters/shoppingList';
import { lockOwn } from '../queries/own';
import { requireVersion } from './requireVersion';

/** Ticks lines off: `bought` holds the colour keys of all lines bought so far. */
export async function updateShoppingList(
  user: CurrentUser,
  id: string,
  { version, bought }: ShoppingListUpdate,
  transaction: Transaction,
): Promise<KeptShoppingList> {
  const row = await lockOwn(ShoppingList, user, id, transaction);
  await requireVersion(row, version, () => presentShoppingList(row));
  const colours = new Set(row.lines.map(({ colour }) => colour));
  const stray = bought.findIndex((key) => !colours.has(key));
  if (stray >= 0) throw invalid({ [`bought.${stray}`]: 'There is no line of this colour' });
  return presentShoppingList(
    await row.update({ bought: [...new Set(bought)], version: version + 1 }, { transaction }),
  );
}
