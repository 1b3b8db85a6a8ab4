import { Op } from 'sequelize';
import { User } from '../../../db/models';
import { issueToken } from '../emailTokens';
import { AppError } from '../errors';
import { addressInUseLetter, confirmationLetter, emailChangingLetter } from '../letters';
import type { Letter } from '../mail';
import { requireOwnPassword } from '../ownPassword';
import { invalid } from '../parseParts';
import { limitCall } from '../rateLimit';
import type { AccountCall } from './registerAccount';

/**
 * Asks for another address: it counts once its letter is followed, until then the old one does.
 * Whether the new address has an account is told to its owner, not to the caller.
 */
export async function requestEmailChange(
  userId: string,
  { email, password }: { email: string; password: string },
  { origin, transaction, now }: AccountCall,
): Promise<{ toNew: Letter; toOld: Letter }> {
  const user = await User.findByPk(userId, { lock: transaction.LOCK.UPDATE, transaction });
  if (!user) throw new AppError('not-found', 'There is no such account.');
  await requireOwnPassword(user, password);
  if (email === user.email) throw invalid({ email: 'This is your address already.' });
  await limitCall('mail', email);

  const owner = await User.findOne({
    where: { email, emailConfirmedAt: { [Op.ne]: null } },
    transaction,
  });
  const token = await issueToken(user, 'confirm', email, { transaction, now });
  await user.update({ pendingEmail: email, version: user.version + 1 }, { transaction });
  return {
    toNew: owner
      ? addressInUseLetter(email, owner.name, origin)
      : confirmationLetter(email, user.name, { origin, token }),
    toOld: emailChangingLetter(user.email, user.name, origin),
  };
}
