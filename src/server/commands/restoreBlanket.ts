import type { Transaction } from 'sequelize';
import { Blanket } from '../../../db/models';
import type { PresentedBlanket } from '../../schemas/blanket';
import type { CurrentUser } from '../../schemas/user';
import { presentBlanket } from '../presenters/blanket';
import { lockOwn } from '../queries/own';

/** Brings a deleted blanket back as it was. */
export async function restoreBlanket(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<PresentedBlanket> {
  const row = await lockOwn(Blanket, user, id, transaction);
  return presentBlanket(await row.update({ deletedAt: null }, { transaction, silent: true }));
}
