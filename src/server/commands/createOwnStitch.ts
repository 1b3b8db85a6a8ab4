import type { Transaction } from 'sequelize';
import { OwnStitchRow } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { OwnStitchInput, PresentedOwnStitch } from '../../schemas/ownStitch';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnStitch } from '../presenters/ownStitch';
import { requireRoom } from './requireRoom';
import { ownStitchColumns, requireFreeWord, STITCH_TAKEN } from './saveOwnStitch';
import { unlessTaken } from './unlessTaken';

export async function createOwnStitch(
  user: CurrentUser,
  input: OwnStitchInput,
  transaction: Transaction,
): Promise<PresentedOwnStitch> {
  await requireRoom(OwnStitchRow, user, KEPT_LIMITS.stitches, 'stitches', transaction);
  requireFreeWord(input);
  const columns = { ownerId: user.id, ...ownStitchColumns(input) };
  return presentOwnStitch(
    await unlessTaken(OwnStitchRow.create(columns, { transaction }), STITCH_TAKEN),
  );
}
