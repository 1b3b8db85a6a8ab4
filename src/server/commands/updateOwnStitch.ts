import type { Transaction } from 'sequelize';
import { OwnStitchRow } from '../../../db/models';
import type { OwnStitchInput, PresentedOwnStitch } from '../../schemas/ownStitch';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnStitch } from '../presenters/ownStitch';
import { lockOwn } from '../queries/own';
import { requireVersion } from './requireVersion';
import { ownStitchColumns, requireFreeWord, STITCH_TAKEN } from './saveOwnStitch';
import { unlessTaken } from './unlessTaken';

export async function updateOwnStitch(
  user: CurrentUser,
  id: string,
  { version, ...input }: OwnStitchInput & { version: number },
  transaction: Transaction,
): Promise<PresentedOwnStitch> {
  const row = await lockOwn(OwnStitchRow, user, id, transaction);
  await requireVersion(row, version, () => presentOwnStitch(row));
  requireFreeWord(input);
  const columns = { ...ownStitchColumns(input), version: version + 1 };
  return presentOwnStitch(await unlessTaken(row.update(columns, { transaction }), STITCH_TAKEN));
}
