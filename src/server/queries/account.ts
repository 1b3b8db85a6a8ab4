import { User } from '../../../db/models';
import type { Account } from '../../schemas/user';
import { AppError } from '../errors';
import { presentAccount } from '../presenters/user';

/** One's own account as it is in the database now. */
export async function findAccount(userId: string): Promise<Account> {
  const row = await User.findByPk(userId, { include: 'roleRows' });
  if (!row) throw new AppError('not-found', 'There is no such account.');
  return presentAccount(row);
}
