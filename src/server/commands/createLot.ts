import type { Transaction } from 'sequelize';
import { Colourway, DyeLot } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { LotInput, PresentedLot } from '../../schemas/stash';
import type { CurrentUser } from '../../schemas/user';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';
import { getLot } from '../queries/stash';
import { requireRoom } from './requireRoom';
import { LOT_TAKEN, lotColumns, replacePartSkeins } from './saveLot';
import { unlessTaken } from './unlessTaken';

export async function createLot(
  user: CurrentUser,
  { colourwayId, ...input }: LotInput,
  transaction: Transaction,
): Promise<PresentedLot> {
  await requireRoom(DyeLot, user, KEPT_LIMITS.lots, 'dye lots', transaction);
  const colourway = await Colourway.findByPk(colourwayId, { transaction });
  if (!colourway || !owns(user, colourway)) {
    throw invalid({ colourwayId: 'You have no such colourway' });
  }
  const row = await unlessTaken(
    DyeLot.create({ ownerId: user.id, colourwayId, ...lotColumns(input) }, { transaction }),
    LOT_TAKEN,
  );
  await replacePartSkeins(row, input.partSkeins, transaction);
  return getLot(user, row.id, transaction);
}
