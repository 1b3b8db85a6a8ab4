import { Op, UniqueConstraintError, type Transaction } from 'sequelize';
import { AuditEntry, EmailToken, sequelize, User } from '../../../db/models';
import { emailSchema } from '../../schemas/account';
import { useToken } from '../emailTokens';
import { AppError } from '../errors';
import { rolesOf } from '../presenters/user';
import { lockAdministrators, lockPerson, replaceRoles } from '../roleRows';

/** Follows the link of a confirmation letter: the address it went to becomes the account's own. */
export async function confirmEmail(
  token: string,
  when: { transaction: Transaction; now: Date },
): Promise<User> {
  const { transaction, now } = when;
  const { userId, email } = await useToken(token, 'confirm', when);
  const user = await lockPerson(userId, transaction);
  if (!user) throw new AppError('gone', 'This account was deleted.');

  await takeAddress(user, email, transaction, now);
  // Letters sent to the address before this one must not work on the account any more.
  await EmailToken.destroy({ where: { userId, usedAt: null }, transaction });
  await makeFirstAdministrator(user, transaction);
  return user;
}

async function takeAddress(
  user: User,
  email: string,
  transaction: Transaction,
  now: Date,
): Promise<void> {
  // An account that never confirmed the address has no claim on it.
  const claim = { email, emailConfirmedAt: null, id: { [Op.ne]: user.id } };
  await User.destroy({ where: claim, transaction });
  const emailConfirmedAt = user.email === email ? (user.emailConfirmedAt ?? now) : now;
  try {
    await sequelize.transaction({ transaction }, (savepoint) =>
      user.update(
        { email, emailConfirmedAt, pendingEmail: null, version: user.version + 1 },
        { transaction: savepoint },
      ),
    );
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw new AppError('conflict', 'Another account has this address by now.');
  }
}

/** How a new installation gets its first administrator: whoever runs it names the address. */
async function makeFirstAdministrator(user: User, transaction: Transaction): Promise<void> {
  const named = emailSchema.safeParse(process.env.ADMINISTRATOR_EMAIL);
  if (!named.success || named.data !== user.email) return;
  if ((await lockAdministrators(transaction)).length > 0) return;

  const before = rolesOf(user);
  const after = [...before, 'administrator' as const];
  await replaceRoles(user.id, after, transaction);
  await AuditEntry.create(
    {
      action: 'first-administrator',
      actorId: user.id,
      actorName: user.name,
      subjectId: user.id,
      subjectName: user.name,
      before,
      after,
    },
    { transaction },
  );
}
