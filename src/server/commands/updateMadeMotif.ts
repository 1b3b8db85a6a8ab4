import type { Transaction } from 'sequelize';
import { MadeMotifRow } from '../../../db/models';
import type { MadeMotifInput, PresentedMadeMotif } from '../../schemas/madeMotif';
import type { CurrentUser } from '../../schemas/user';
import { presentMadeMotif } from '../presenters/madeMotif';
import { lockOwn } from '../queries/own';
import { requireVersion } from './requireVersion';
import { madeMotifColumns, requireMotif, requireOwnSwatch } from './saveMadeMotif';

export async function updateMadeMotif(
  user: CurrentUser,
  id: string,
  { version, ...input }: MadeMotifInput & { version: number },
  transaction: Transaction,
): Promise<PresentedMadeMotif> {
  const row = await lockOwn(MadeMotifRow, user, id, transaction);
  await requireVersion(row, version, () => presentMadeMotif(row));
  // What was made of a motif that has gone since can still be put right.
  const isSameMotif = row.motifKey === input.motifKey && row.rounds === input.rounds;
  if (!isSameMotif) await requireMotif(user, input, transaction);
  await requireOwnSwatch(user, input.swatchId, transaction);
  const columns = { ...madeMotifColumns(input), version: version + 1 };
  return presentMadeMotif(await row.update(columns, { transaction }));
}
