import { OwnStitchRow } from '../../../db/models';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { PresentedOwnStitch } from '../../schemas/ownStitch';
import type { CurrentUser } from '../../schemas/user';
import { presentOwnStitch } from '../presenters/ownStitch';

const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.stitches, offset: 0 };

/** One's own stitches in the order of the alphabet. */
export async function listOwnStitches(
  user: CurrentUser,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: PresentedOwnStitch[]; total: number }> {
  const where = { ownerId: user.id };
  const [rows, total] = await Promise.all([
    OwnStitchRow.findAll({ where, order: ['abbreviation'], limit, offset }),
    OwnStitchRow.count({ where }),
  ]);
  return { items: rows.map(presentOwnStitch), total };
}
