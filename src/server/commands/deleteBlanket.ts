import type { Transaction } from 'sequelize';
import { Blanket } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';

/** Puts a blanket away; `restoreBlanket` brings it back. */
export async function deleteBlanket(
  user: CurrentUser,
  id: string,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  const row = await lockOwn(Blanket, user, id, transaction);
  if (!row.deletedAt) await row.update({ deletedAt: now }, { transaction, silent: true });
}
