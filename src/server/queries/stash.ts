import { fn, col, type Includeable, type Transaction } from 'sequelize';
import { DyeLot, PartSkein } from '../../../db/models';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedLot } from '../../schemas/stash';
import type { CurrentUser } from '../../schemas/user';
import { presentLot } from '../presenters/lot';
import { loadOwn } from './own';

export const WITH_ALL_OF_A_LOT: Includeable[] = [
  { association: 'colourway', include: [{ association: 'yarn' }] },
  { model: PartSkein, as: 'partSkeins', separate: true, order: ['position'] },
];
const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.lots, offset: 0 };

/** One's stash by yarn, colour and dye lot. */
export async function listStash(
  user: CurrentUser,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedLot[]; total: number }> {
  const where = { ownerId: user.id };
  const [rows, total] = await Promise.all([
    DyeLot.findAll({
      where,
      include: WITH_ALL_OF_A_LOT,
      order: [
        [fn('lower', col('colourway.yarn.name')), 'ASC'],
        [fn('lower', col('colourway.name')), 'ASC'],
        'lotCode',
      ],
      limit,
      offset,
    }),
    DyeLot.count({ where }),
  ]);
  return { items: rows.map(presentLot), total };
}

export async function getLot(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<PresentedLot> {
  return presentLot(await loadOwn(DyeLot, user, id, { include: WITH_ALL_OF_A_LOT, transaction }));
}
