import { Op, type Transaction } from 'sequelize';
import { Blanket, BlanketRevision } from '../../../db/models';
import type {
  BlanketsQuery,
  BlanketSummary,
  PresentedBlanket,
  PresentedRevision,
  RevisionWithPlan,
} from '../../schemas/blanket';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import {
  presentBlanket,
  presentBlanketSummary,
  presentRevision,
  presentRevisionWithPlan,
} from '../presenters/blanket';
import { loadOwn } from './own';

const EVERYTHING: BlanketsQuery = { limit: KEPT_LIMITS.blankets, offset: 0, deleted: 'no' };

/** One's blankets with their headline figures, last changed first. */
export async function listBlankets(
  user: CurrentUser,
  { limit, offset, deleted }: BlanketsQuery = EVERYTHING,
): Promise<{ items: BlanketSummary[]; total: number }> {
  const where = {
    ownerId: user.id,
    deletedAt: deleted === 'only' ? { [Op.not]: null } : null,
  };
  const [rows, total] = await Promise.all([
    Blanket.findAll({ where, order: [['updatedAt', 'DESC'], 'id'], limit, offset }),
    Blanket.count({ where }),
  ]);
  return { items: rows.map(presentBlanketSummary), total };
}

/** Also a deleted one, which says when it was deleted. */
export async function getBlanket(
  user: CurrentUser,
  id: string,
  transaction?: Transaction,
): Promise<PresentedBlanket> {
  return presentBlanket(await loadOwn(Blanket, user, id, { transaction }));
}

/** The saves of a blanket that are kept, newest first. */
export async function listRevisions(
  user: CurrentUser,
  id: string,
): Promise<{ items: PresentedRevision[]; total: number }> {
  const blanket = await loadOwn(Blanket, user, id);
  const rows = await BlanketRevision.findAll({
    attributes: { exclude: ['plan'] },
    where: { blanketId: blanket.id },
    order: [['version', 'DESC']],
  });
  return {
    items: rows.map((row) => presentRevision(row, blanket.version)),
    total: rows.length,
  };
}

export async function getRevision(
  user: CurrentUser,
  id: string,
  version: number,
): Promise<RevisionWithPlan> {
  const blanket = await loadOwn(Blanket, user, id);
  return presentRevisionWithPlan(await loadRevision(blanket, version), blanket.version);
}

export async function loadRevision(
  blanket: Blanket,
  version: number,
  transaction?: Transaction,
): Promise<BlanketRevision> {
  const row = await BlanketRevision.findOne({
    where: { blanketId: blanket.id, version },
    transaction,
  });
  if (!row) throw new AppError('not-found', 'This save of the blanket is not kept.');
  return row;
}
