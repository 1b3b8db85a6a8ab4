import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import type { MotifInput, PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnMotif } from '../presenters/motif';
import { lockOwn } from '../queries/own';
import { requireVersion } from './requireVersion';

/** Blankets keep the motif as it was when they were planned. */
export async function updateMotif(
  user: CurrentUser,
  id: string,
  { version, name, sides, ring, rounds }: MotifInput & { version: number },
  transaction: Transaction,
): Promise<PresentedMotif> {
  const row = await lockOwn(MotifRow, user, id, transaction);
  await requireVersion(row, version, () => presentOwnMotif(row));
  return presentOwnMotif(
    await row.update({ name, sides, ring, rounds, version: version + 1 }, { transaction }),
  );
}
