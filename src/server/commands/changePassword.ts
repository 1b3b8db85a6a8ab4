import { User } from '../../../db/models';
import { AppError } from '../errors';
import { passwordChangedLetter } from '../letters';
import type { Letter } from '../mail';
import { requireOtherThanAddress, requireOwnPassword } from '../ownPassword';
import { hashPassword } from '../passwordHash';
import type { AccountCall } from './registerAccount';

/** Sets a new password and ends every session; the caller's own is to be begun again. */
export async function changePassword(
  userId: string,
  { currentPassword, password }: { currentPassword: string; password: string },
  { origin, transaction }: AccountCall,
): Promise<{ user: User; letter: Letter }> {
  const user = await User.findByPk(userId, { lock: transaction.LOCK.UPDATE, transaction });
  if (!user) throw new AppError('not-found', 'There is no such account.');
  await requireOwnPassword(user, currentPassword, 'currentPassword');
  requireOtherThanAddress(password, user.email);
  await user.update(
    { passwordHash: await hashPassword(password), tokenVersion: user.tokenVersion + 1 },
    { transaction },
  );
  return { user, letter: passwordChangedLetter(user.email, user.name, origin) };
}
