import { fn, col, type Transaction } from 'sequelize';
import { MotifRow } from '../../../db/models';
import { LIBRARY_MOTIFS, readyMotif } from '../../lib/motifs/readyMotifs';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedMotif } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnMotif, presentReadyMotif } from '../presenters/motif';
import { loadOwn } from './own';

const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.motifs + LIBRARY_MOTIFS.length, offset: 0 };

/** The ready-made motifs, then one's own by name; without a user, the ready-made ones. */
export async function listMotifs(
  user: CurrentUser | null,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedMotif[]; total: number }> {
  const ready = LIBRARY_MOTIFS.map(presentReadyMotif);
  const own = user ? await ownMotifs(user) : [];
  const all = [...ready, ...own];
  return { items: all.slice(offset, offset + limit), total: all.length };
}

async function ownMotifs(user: CurrentUser): Promise<PresentedMotif[]> {
  const rows = await MotifRow.findAll({
    where: { ownerId: user.id },
    order: [[fn('lower', col('name')), 'ASC'], 'id'],
  });
  return rows.map(presentOwnMotif);
}

/** A ready-made motif by its key, or one of one's own by its id. */
export async function getMotif(
  user: CurrentUser,
  key: string,
  transaction?: Transaction,
): Promise<PresentedMotif> {
  const ready = readyMotif(key);
  if (ready) return presentReadyMotif(ready);
  return presentOwnMotif(await loadOwn(MotifRow, user, key, { transaction }));
}
