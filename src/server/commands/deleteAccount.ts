import type { Transaction } from 'sequelize';
import { AuditEntry } from '../../../db/models';
import { AppError } from '../errors';
import { requireOwnPassword } from '../ownPassword';
import { mayLeaveAdministration } from '../policies/people';
import { lockAdministrators, lockPerson } from '../roleRows';

const NOBODY = 'a deleted account';

/** Deletes an account and, by the database's cascades, all that belongs to it. */
export async function deleteAccount(
  userId: string,
  password: string,
  transaction: Transaction,
): Promise<void> {
  const administrators = await lockAdministrators(transaction);
  const user = await lockPerson(userId, transaction);
  if (!user) throw new AppError('not-found', 'There is no such account.');
  await requireOwnPassword(user, password);
  if (!mayLeaveAdministration(userId, administrators)) {
    throw new AppError(
      'last-administrator',
      'You are the last administrator. Make someone else one first.',
    );
  }
  await AuditEntry.update({ actorName: NOBODY }, { where: { actorId: userId }, transaction });
  await AuditEntry.update({ subjectName: NOBODY }, { where: { subjectId: userId }, transaction });
  await user.destroy({ transaction });
}
