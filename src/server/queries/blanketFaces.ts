import { Blanket } from '../../../db/models';
import { blanketFace, type BlanketFace } from '../../lib/plan/blanketFace';
import type { CurrentUser } from '../../schemas/user';

/**
 * What the small drawings of one's blankets show, by the blanket's id: of those named, or of all,
 * deleted ones as well.
 */
export async function listBlanketFaces(
  user: CurrentUser,
  ids?: readonly string[],
): Promise<Record<string, BlanketFace>> {
  const rows = await Blanket.findAll({
    attributes: ['id', 'plan'],
    where: { ownerId: user.id, ...(ids && { id: [...ids] }) },
  });
  return Object.fromEntries(rows.map(({ id, plan }) => [id, blanketFace(plan)]));
}
