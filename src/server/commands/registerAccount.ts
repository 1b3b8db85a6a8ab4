import { UniqueConstraintError, type Transaction } from 'sequelize';
import { sequelize, User } from '../../../db/models';
import type { Registration } from '../../schemas/account';
import { issueToken } from '../emailTokens';
import { alreadyRegisteredLetter, confirmationLetter } from '../letters';
import type { Letter } from '../mail';
import { hashPassword } from '../passwordHash';
import { limitCall } from '../rateLimit';
import { replaceRoles } from '../roleRows';

export interface AccountCall {
  origin: string;
  transaction: Transaction;
  now: Date;
}

/**
 * Makes an account to be confirmed, and the letter to send. An address with an account gets a letter
 * that says so, and the caller cannot tell the difference. While an account is unconfirmed the last
 * registration counts: its letter confirms the password that was given with it.
 */
export async function registerAccount(
  { name, email, password, roles }: Registration,
  { origin, transaction, now }: AccountCall,
): Promise<Letter> {
  await limitCall('mail', email);
  const passwordHash = await hashPassword(password);

  const user = await createOrFind({ name, email, passwordHash }, transaction);
  if (user.emailConfirmedAt) return alreadyRegisteredLetter(email, user.name, origin);

  await user.update({ name, passwordHash }, { transaction });
  await replaceRoles(user.id, roles, transaction);
  const token = await issueToken(user, 'confirm', email, { transaction, now });
  return confirmationLetter(email, name, { origin, token });
}

/** The unique index decides between two registrations at once; its refusal is a normal outcome. */
async function createOrFind(
  values: { name: string; email: string; passwordHash: string },
  transaction: Transaction,
): Promise<User> {
  try {
    // A savepoint, since a refused insert would end the whole transaction.
    return await sequelize.transaction({ transaction }, (savepoint) =>
      User.create(values, { transaction: savepoint }),
    );
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    return User.findOne({
      where: { email: values.email },
      lock: transaction.LOCK.UPDATE,
      rejectOnEmpty: true,
      transaction,
    });
  }
}
