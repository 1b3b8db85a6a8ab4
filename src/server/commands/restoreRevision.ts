import type { Transaction } from 'sequelize';
import type { PresentedBlanket } from '../../schemas/blanket';
import { planSchema } from '../../schemas/plan';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { loadRevision } from '../queries/blankets';
import { lockBlanket } from './lockBlanket';
import { updateBlanket } from './updateBlanket';

/** Saves an older version again, as the newest: nothing saved since is lost. */
export async function restoreRevision(
  user: CurrentUser,
  id: string,
  { from, version }: { from: number; version: number },
  transaction: Transaction,
): Promise<PresentedBlanket> {
  const blanket = await lockBlanket(user, id, transaction);
  const { title, plan } = await loadRevision(blanket, from, transaction);
  const readable = planSchema.safeParse(plan);
  if (!readable.success) {
    throw new AppError('gone', 'This save was made for an older edition and can only be read.');
  }
  return updateBlanket(user, id, { title, plan: readable.data, version }, transaction);
}
