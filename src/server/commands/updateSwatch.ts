import type { Transaction } from 'sequelize';
import { Swatch } from '../../../db/models';
import type { PresentedSwatch, SwatchInput } from '../../schemas/swatch';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';
import { getSwatch } from '../queries/swatches';
import { requireVersion } from './requireVersion';
import { replaceMeasurements, requireOwnYarn, swatchColumns } from './saveSwatch';

export async function updateSwatch(
  user: CurrentUser,
  id: string,
  { version, ...input }: SwatchInput & { version: number },
  transaction: Transaction,
): Promise<PresentedSwatch> {
  const row = await lockOwn(Swatch, user, id, transaction);
  await requireVersion(row, version, () => getSwatch(user, id, transaction));
  await requireOwnYarn(user, input.yarnId, transaction);
  await row.update({ ...swatchColumns(input), version: version + 1 }, { transaction });
  await replaceMeasurements(row, input.measurements, transaction);
  return getSwatch(user, id, transaction);
}
