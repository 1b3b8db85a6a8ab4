import type { Transaction } from 'sequelize';
import { Colourway } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import type { PresentedColourway } from '../../schemas/yarn';
import { presentColourway } from '../presenters/yarn';
import { lockOwn } from '../queries/own';
import { NAME_TAKEN } from './createColourway';
import { requireVersion } from './requireVersion';
import { unlessTaken } from './unlessTaken';

export async function updateColourway(
  user: CurrentUser,
  id: string,
  { version, name, hex }: { version: number; name: string; hex: string },
  transaction: Transaction,
): Promise<PresentedColourway> {
  const row = await lockOwn(Colourway, user, id, transaction);
  await requireVersion(row, version, () => presentColourway(row));
  return presentColourway(
    await unlessTaken(row.update({ name, hex, version: version + 1 }, { transaction }), NAME_TAKEN),
  );
}
