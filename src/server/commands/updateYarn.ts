import type { Transaction } from 'sequelize';
import { DyeLot, PartSkein, Yarn } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import type { PresentedYarn, YarnInput } from '../../schemas/yarn';
import { invalid } from '../parseParts';
import { lockOwn } from '../queries/own';
import { getYarn } from '../queries/yarns';
import { yarnColumns } from './createYarn';
import { requireVersion } from './requireVersion';

export async function updateYarn(
  user: CurrentUser,
  id: string,
  { version, ...input }: YarnInput & { version: number },
  transaction: Transaction,
): Promise<PresentedYarn> {
  const row = await lockOwn(Yarn, user, id, transaction);
  await requireVersion(row, version, () => getYarn(user, id, transaction));
  await requireSkeinAsHeavyAsItsParts(row, input.putUp.massG, transaction);
  await row.update({ ...yarnColumns(input), version: version + 1 }, { transaction });
  return getYarn(user, id, transaction);
}

async function requireSkeinAsHeavyAsItsParts(
  yarn: Yarn,
  massG: number,
  transaction: Transaction,
): Promise<void> {
  const lots = await DyeLot.findAll({
    attributes: ['id'],
    include: { association: 'colourway', attributes: [], where: { yarnId: yarn.id } },
    transaction,
  });
  const dyeLotId = lots.map((lot) => lot.id);
  const heaviestG = await PartSkein.max<number | null, PartSkein>('massG', {
    where: { dyeLotId },
    transaction,
  });
  if (heaviestG !== null && heaviestG > massG) {
    throw invalid({
      'putUp.massG': `A part skein of ${heaviestG} g in your stash is heavier than that`,
    });
  }
}
