import type { Transaction } from 'sequelize';
import { Blanket, MakingTick, MakingWeighing } from '../../../db/models';
import type { Making } from '../../schemas/making';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { presentMaking } from '../presenters/making';
import { loadOwn } from './own';

/** How far one's blanket is made. Throws `gone` for a deleted one. */
export async function getMaking(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<Making> {
  const blanket = await loadOwn(Blanket, user, id, { transaction });
  if (blanket.deletedAt) throw new AppError('gone', 'This blanket was deleted.');
  const where = { blanketId: blanket.id };
  const ticks = await MakingTick.findAll({ where, order: ['motif'], transaction });
  const weighings = await MakingWeighing.findAll({ where, order: ['at', 'id'], transaction });
  return presentMaking(blanket, ticks, weighings);
}
