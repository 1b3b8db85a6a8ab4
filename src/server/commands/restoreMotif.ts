import type { Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import type { PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { loadMotifVersion } from '../queries/motifs';
import { lockOwn } from '../queries/own';
import { updateMotif } from './updateMotif';

/** Saves an older version again, as the newest: nothing saved since is lost. */
export async function restoreMotif(
  user: CurrentUser,
  id: string,
  { from, version }: { from: number; version: number },
  transaction: Transaction,
): Promise<PresentedMotif> {
  const motif = await lockOwn(MotifRow, user, id, transaction);
  const { name, text, terms, sides, size, stitches } = await loadMotifVersion(
    motif,
    from,
    transaction,
  );
  const input = { name, text, terms, sides, size, stitches, version };
  return updateMotif(user, id, input, transaction);
}
