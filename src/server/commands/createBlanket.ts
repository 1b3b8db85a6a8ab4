import type { Transaction } from 'sequelize';
import { Blanket } from '../../../db/models';
import type { BlanketInput, PresentedBlanket } from '../../schemas/blanket';
import { KEPT_LIMITS } from '../../schemas/limits';
import { PLAN_SCHEMA_VERSION } from '../../schemas/plan';
import type { CurrentUser } from '../../schemas/user';
import { presentBlanket } from '../presenters/blanket';
import { keepRevision } from './keepRevision';
import { requireRoom } from './requireRoom';

export async function createBlanket(
  user: CurrentUser,
  { title, plan }: BlanketInput,
  transaction: Transaction,
): Promise<PresentedBlanket> {
  await requireRoom(Blanket, user, KEPT_LIMITS.blankets, 'blankets', transaction);
  const row = await Blanket.create(
    { ownerId: user.id, title, plan, schemaVersion: PLAN_SCHEMA_VERSION },
    { transaction },
  );
  await keepRevision(row, transaction);
  return presentBlanket(row);
}
