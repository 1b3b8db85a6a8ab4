import { Op, type Transaction } from 'sequelize';
import { BlanketColourLink } from '../../../db/models';
import type { BlanketInput, PresentedBlanket } from '../../schemas/blanket';
import { PLAN_SCHEMA_VERSION } from '../../schemas/plan';
import type { CurrentUser } from '../../schemas/user';
import { presentBlanket } from '../presenters/blanket';
import { keepRevision } from './keepRevision';
import { lockBlanket } from './lockBlanket';
import { requireVersion } from './requireVersion';

export async function updateBlanket(
  user: CurrentUser,
  id: string,
  { version, title, plan }: BlanketInput & { version: number },
  transaction: Transaction,
): Promise<PresentedBlanket> {
  const row = await lockBlanket(user, id, transaction);
  await requireVersion(row, version, () => presentBlanket(row));
  await row.update(
    { title, plan, schemaVersion: PLAN_SCHEMA_VERSION, version: version + 1 },
    { transaction },
  );
  await keepRevision(row, transaction);
  // A colour that is gone takes its link along, or the next colour of that key would inherit it.
  const keys = plan.colours.map(({ key }) => key);
  await BlanketColourLink.destroy({
    where: { blanketId: id, colourKey: { [Op.notIn]: keys } },
    transaction,
  });
  return presentBlanket(row);
}
