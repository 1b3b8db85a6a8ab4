import type { Transaction } from 'sequelize';
import { User, UserRole } from '../../db/models';
import type { Role } from '../schemas/roles';

/** Gives a person exactly these roles. */
export async function replaceRoles(
  userId: string,
  roles: readonly Role[],
  transaction: Transaction,
): Promise<void> {
  await UserRole.destroy({ where: { userId }, transaction });
  await UserRole.bulkCreate(
    roles.map((role) => ({ userId, role })),
    { transaction },
  );
}

/** Who can administrate, locked until the transaction ends so that two cannot remove each other. */
export async function lockAdministrators(transaction: Transaction): Promise<string[]> {
  const rows = await UserRole.findAll({
    where: { role: 'administrator' },
    order: ['userId'],
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  return rows.map(({ userId }) => userId);
}

/** A person with their roles, locked for a change. */
export async function lockPerson(id: string, transaction: Transaction): Promise<User | null> {
  const user = await User.findByPk(id, { lock: transaction.LOCK.UPDATE, transaction });
  if (user) user.roleRows = await UserRole.findAll({ where: { userId: id }, transaction });
  return user;
}
