import type { FindOptions, Model, ModelStatic, Transaction } from 'sequelize';
import { uuid } from '../../schemas/fields';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { owns } from '../policies/own';

export type OwnedRow = Model & { id: string; ownerId: string };

/**
 * A row of the caller's own. Throws `not-found` for an unknown id and, in the same words, for
 * another person's.
 */
export async function loadOwn<Row extends OwnedRow>(
  model: ModelStatic<Row>,
  user: CurrentUser,
  id: string,
  options: Omit<FindOptions, 'where'> = {},
): Promise<Row> {
  const row = uuid.safeParse(id).success ? await model.findByPk(id, options) : null;
  if (!row || !owns(user, row)) {
    throw new AppError('not-found', 'There is nothing of yours at this address.');
  }
  return row;
}

/** The same, locked until the transaction ends: whoever saves second waits here and then compares. */
export function lockOwn<Row extends OwnedRow>(
  model: ModelStatic<Row>,
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<Row> {
  return loadOwn(model, user, id, { transaction, lock: transaction.LOCK.UPDATE });
}

/** For pages: null where a route would answer 404. */
export async function orNull<Found>(found: Promise<Found>): Promise<Found | null> {
  try {
    return await found;
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null;
    throw error;
  }
}
