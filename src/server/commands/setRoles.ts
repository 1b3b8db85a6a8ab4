import type { Transaction } from 'sequelize';
import { AuditEntry, type User } from '../../../db/models';
import type { RolesChange } from '../../schemas/people';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { mayLeaveAdministration } from '../policies/people';
import { presentPerson } from '../presenters/people';
import { rolesOf } from '../presenters/user';
import { lockAdministrators, lockPerson, replaceRoles } from '../roleRows';

/** Gives a person exactly these roles, and writes down who did it. */
export async function setRoles(
  actor: CurrentUser,
  subjectId: string,
  { roles, version }: RolesChange,
  transaction: Transaction,
): Promise<User> {
  const administrators = await lockAdministrators(transaction);
  const subject = await lockPerson(subjectId, transaction);
  if (!subject) throw new AppError('not-found', 'There is no such person.');
  if (subject.version !== version) {
    throw new AppError('conflict', 'This person was changed by someone else in the meantime.', {
      current: presentPerson(subject),
    });
  }
  const staysAdministrator = roles.includes('administrator');
  if (!staysAdministrator && !mayLeaveAdministration(subjectId, administrators)) {
    throw new AppError(
      'last-administrator',
      'This is the last administrator. Make someone else one first.',
    );
  }
  const before = rolesOf(subject);
  await replaceRoles(subjectId, roles, transaction);
  await subject.update({ version: version + 1 }, { transaction });
  await subject.reload({ include: 'roleRows', transaction });
  await AuditEntry.create(
    {
      action: 'roles-set',
      actorId: actor.id,
      actorName: actor.name,
      subjectId,
      subjectName: subject.name,
      before,
      after: rolesOf(subject),
    },
    { transaction },
  );
  return subject;
}
