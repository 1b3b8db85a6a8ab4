import type { Transaction } from 'sequelize';
import { User } from '../../../db/models';
import type { PreferencesChange } from '../../schemas/preferences';

/** Changes what is named and leaves the rest: two switches thrown at once both count. */
export async function changePreferences(
  userId: string,
  change: PreferencesChange,
  transaction: Transaction,
): Promise<void> {
  await User.update(change, { where: { id: userId }, transaction });
}
