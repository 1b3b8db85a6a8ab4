import type { ModelStatic, Transaction } from 'sequelize';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import type { OwnedRow } from '../queries/own';

/** Refuses a new row once a person keeps as many as are allowed. */
export async function requireRoom(
  model: ModelStatic<OwnedRow>,
  user: CurrentUser,
  most: number,
  what: string,
  transaction: Transaction,
): Promise<void> {
  const kept = await model.count({ where: { ownerId: user.id }, transaction });
  if (kept >= most) {
    throw new AppError('invalid', `You keep ${kept} ${what} already, the most there can be.`);
  }
}
