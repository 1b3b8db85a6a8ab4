import type { Transaction } from 'sequelize';
import { Blanket } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { lockOwn } from '../queries/own';

/** One's blanket for a change; a deleted one must be restored first. */
export async function lockBlanket(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<Blanket> {
  const row = await lockOwn(Blanket, user, id, transaction);
  if (row.deletedAt) throw new AppError('gone', 'This blanket was deleted. Restore it first.');
  return row;
}
