import type { Transaction } from 'sequelize';
import { Colourway } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';
import { refuseWhileInStash } from './refuseWhileInStash';

export async function deleteColourway(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  const row = await lockOwn(Colourway, user, id, transaction);
  await refuseWhileInStash('colourway', row.destroy({ transaction }));
}
