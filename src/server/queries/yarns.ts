import { fn, col, type Transaction } from 'sequelize';
import { Colourway, Yarn } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { ListQuery } from '../../schemas/fields';
import type { CurrentUser } from '../../schemas/user';
import type { PresentedColourway, PresentedYarn } from '../../schemas/yarn';
import { presentColourway, presentYarn } from '../presenters/yarn';
import { loadOwn } from './own';

const withColourways = {
  model: Colourway,
  as: 'colourways',
  separate: true,
  order: [[fn('lower', col('name')), 'ASC']] as [[ReturnType<typeof fn>, string]],
};
const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.yarns, offset: 0 };

/** One's yarns by name, each with its colourways. */
export async function listYarns(
  user: CurrentUser,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedYarn[]; total: number }> {
  const where = { ownerId: user.id };
  const [rows, total] = await Promise.all([
    Yarn.findAll({
      where,
      include: withColourways,
      order: [[fn('lower', col('name')), 'ASC'], 'id'],
      limit,
      offset,
    }),
    Yarn.count({ where }),
  ]);
  return { items: rows.map(presentYarn), total };
}

export async function getYarn(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<PresentedYarn> {
  return presentYarn(await loadOwn(Yarn, user, id, { include: withColourways, transaction }));
}

export async function getColourway(user: CurrentUser, id: string): Promise<PresentedColourway> {
  return presentColourway(await loadOwn(Colourway, user, id));
}
