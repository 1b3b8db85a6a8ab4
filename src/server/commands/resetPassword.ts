import { EmailToken, User } from '../../../db/models';
import { requireOtherThanAddress } from '../ownPassword';
import { useToken } from '../emailTokens';
import { passwordChangedLetter } from '../letters';
import type { Letter } from '../mail';
import { hashPassword } from '../passwordHash';
import type { AccountCall } from './registerAccount';

/**
 * Sets a new password by the link of a reset letter, and ends every session. The letter reached the
 * address, so this confirms it too.
 */
export async function resetPassword(
  { token, password }: { token: string; password: string },
  { origin, transaction, now }: AccountCall,
): Promise<Letter> {
  const { userId, email } = await useToken(token, 'reset', { transaction, now });
  const user = await User.findByPk(userId, {
    lock: transaction.LOCK.UPDATE,
    rejectOnEmpty: true,
    transaction,
  });
  requireOtherThanAddress(password, email);
  await user.update(
    {
      passwordHash: await hashPassword(password),
      tokenVersion: user.tokenVersion + 1,
      emailConfirmedAt: user.emailConfirmedAt ?? now,
    },
    { transaction },
  );
  await EmailToken.destroy({ where: { userId, usedAt: null }, transaction });
  return passwordChangedLetter(email, user.name, origin);
}
