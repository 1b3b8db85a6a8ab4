import type { Transaction } from 'sequelize';
import { DyeLot } from '../../../db/models';
import type { LotUpdate, PresentedLot } from '../../schemas/stash';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';
import { getLot } from '../queries/stash';
import { requireVersion } from './requireVersion';
import { LOT_TAKEN, lotColumns, replacePartSkeins } from './saveLot';
import { unlessTaken } from './unlessTaken';

export async function updateLot(
  user: CurrentUser,
  id: string,
  { version, ...input }: LotUpdate,
  transaction: Transaction,
): Promise<PresentedLot> {
  const row = await lockOwn(DyeLot, user, id, transaction);
  await requireVersion(row, version, () => getLot(user, id, transaction));
  await unlessTaken(
    row.update({ ...lotColumns(input), version: version + 1 }, { transaction }),
    LOT_TAKEN,
  );
  await replacePartSkeins(row, input.partSkeins, transaction);
  return getLot(user, id, transaction);
}
