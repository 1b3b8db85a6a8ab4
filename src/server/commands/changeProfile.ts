import type { Transaction } from 'sequelize';
import type { User } from '../../../db/models';
import type { Profile } from '../../schemas/account';
import { AppError } from '../errors';
import { presentAccount, rolesOf } from '../presenters/user';
import { lockPerson, replaceRoles } from '../roleRows';

/** Changes one's own name and working roles; administrator is kept as it is. */
export async function changeProfile(
  userId: string,
  { name, roles, version }: Profile,
  transaction: Transaction,
): Promise<User> {
  const user = await lockPerson(userId, transaction);
  if (!user) throw new AppError('not-found', 'There is no such account.');
  if (user.version !== version) {
    throw new AppError('conflict', 'Your account was changed elsewhere in the meantime.', {
      current: presentAccount(user),
    });
  }
  const kept = rolesOf(user).filter((role) => role === 'administrator');
  await replaceRoles(userId, [...roles, ...kept], transaction);
  await user.update({ name, version: version + 1 }, { transaction });
  return user.reload({ include: 'roleRows', transaction });
}
