import { MadeMotifRow } from '../../../db/models';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedMadeMotif } from '../../schemas/madeMotif';
import type { CurrentUser } from '../../schemas/user';
import { presentMadeMotif } from '../presenters/madeMotif';

const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.madeMotifs, offset: 0 };

/** What one has made of a motif, or of any, and measured; the last made first. */
export async function listMadeMotifs(
  user: CurrentUser,
  motifKey?: string,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedMadeMotif[]; total: number }> {
  const where = { ownerId: user.id, ...(motifKey !== undefined && { motifKey }) };
  const [rows, total] = await Promise.all([
    MadeMotifRow.findAll({
      where,
      order: [['madeOn', 'DESC'], ['createdAt', 'DESC'], 'id'],
      limit,
      offset,
    }),
    MadeMotifRow.count({ where }),
  ]);
  return { items: rows.map(presentMadeMotif), total };
}
