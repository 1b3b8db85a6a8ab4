import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import type { MotifInput, PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnMotif } from '../presenters/motif';
import { lockOwn } from '../queries/own';
import { requireVersion } from './requireVersion';
import { keepMotifVersion, motifColumns } from './saveMotif';

/** Blankets keep the motif as it was when they were planned. */
export async function updateMotif(
  user: CurrentUser,
  id: string,
  { version, ...input }: MotifInput & { version: number },
  transaction: Transaction,
): Promise<PresentedMotif> {
  const row = await lockOwn(MotifRow, user, id, transaction);
  await requireVersion(row, version, () => presentOwnMotif(row));
  await row.update({ ...motifColumns(input), version: version + 1 }, { transaction });
  await keepMotifVersion(row, transaction);
  return presentOwnMotif(row);
}
