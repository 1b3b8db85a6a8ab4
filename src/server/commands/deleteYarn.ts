import type { Transaction } from 'sequelize';
import { Yarn } from '../../../db/models';
import type { CurrentUser } from '../../schemas/user';
import { lockOwn } from '../queries/own';
import { refuseWhileInStash } from './refuseWhileInStash';

/** Its colourways go with it; swatches stay, without a yarn. Refused while it is in the stash. */
export async function deleteYarn(
  user: CurrentUser,
  id: string,
  transaction: Transaction,
): Promise<void> {
  const row = await lockOwn(Yarn, user, id, transaction);
  await refuseWhileInStash('yarn', row.destroy({ transaction }));
}
