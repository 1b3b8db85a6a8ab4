import type { Transaction } from 'sequelize';
import { Swatch } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedSwatch, SwatchInput } from '../../schemas/swatch';
import type { CurrentUser } from '../../schemas/user';
import { getSwatch } from '../queries/swatches';
import { requireRoom } from './requireRoom';
import { replaceMeasurements, requireOwnYarn, swatchColumns } from './saveSwatch';

export async function createSwatch(
  user: CurrentUser,
  input: SwatchInput,
  transaction: Transaction,
): Promise<PresentedSwatch> {
  await requireRoom(Swatch, user, KEPT_LIMITS.swatches, 'swatches', transaction);
  await requireOwnYarn(user, input.yarnId, transaction);
  const row = await Swatch.create({ ownerId: user.id, ...swatchColumns(input) }, { transaction });
  await replaceMeasurements(row, input.measurements, transaction);
  return getSwatch(user, row.id, transaction);
}
