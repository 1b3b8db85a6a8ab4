import type { Transaction } from 'sequelize';
import { Yarn } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { CurrentUser } from '../../schemas/user';
import type { PresentedYarn, YarnInput } from '../../schemas/yarn';
import { presentYarn } from '../presenters/yarn';
import { requireRoom } from './requireRoom';

export async function createYarn(
  user: CurrentUser,
  input: YarnInput,
  transaction: Transaction,
): Promise<PresentedYarn> {
  await requireRoom(Yarn, user, KEPT_LIMITS.yarns, 'yarns', transaction);
  return presentYarn(
    await Yarn.create({ ownerId: user.id, ...yarnColumns(input) }, { transaction }),
  );
}

export function yarnColumns({ name, maker, fibre, weightCategory, putUp, price }: YarnInput) {
  return {
    name,
    maker,
    fibre,
    weightCategory,
    putUpMassG: putUp.massG,
    putUpLengthM: putUp.lengthM,
    priceMinor: price?.priceMinor ?? null,
    currency: price?.currency ?? null,
  };
}
