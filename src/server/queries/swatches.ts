import type { Includeable, Transaction } from 'sequelize';
import { Swatch, SwatchMeasurement } from '../../../db/models';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedSwatch } from '../../schemas/swatch';
import type { CurrentUser } from '../../schemas/user';
import { presentSwatch } from '../presenters/swatch';
import { loadOwn } from './own';

const WITH_MEASUREMENTS: Includeable[] = [
  { association: 'yarn' },
  { model: SwatchMeasurement, as: 'measurements', separate: true, order: ['position'] },
];
const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.swatches, offset: 0 };

/** One's swatches, last changed first. */
export async function listSwatches(
  user: CurrentUser,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedSwatch[]; total: number }> {
  const where = { ownerId: user.id };
  const [rows, total] = await Promise.all([
    Swatch.findAll({
      where,
      include: WITH_MEASUREMENTS,
      order: [['updatedAt', 'DESC'], 'id'],
      limit,
      offset,
    }),
    Swatch.count({ where }),
  ]);
  return { items: rows.map(presentSwatch), total };
}

export async function getSwatch(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<PresentedSwatch> {
  return presentSwatch(
    await loadOwn(Swatch, user, id, { include: WITH_MEASUREMENTS, transaction }),
  );
}
