import { fn, col, type Transaction } from 'sequelize';
import { MotifRow, MotifVersion } from '../../../db/models';
import { motifChoices, type MotifChoice } from '../../lib/motifs/motifChoices';
import { READY_MOTIFS } from '../../lib/motifs/readyMotifs';
import type { ListQuery } from '../../schemas/fields';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { MotifSummary, PresentedMotif, PresentedMotifVersion } from '../../schemas/motif';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import {
  presentMotifAsSaved,
  presentMotifVersion,
  presentOwnMotif,
  presentOwnMotifSummary,
  presentReadyMotif,
} from '../presenters/motif';
import { loadOwn } from './own';

const EVERYTHING: ListQuery = { limit: KEPT_LIMITS.motifs + READY_MOTIFS.length, offset: 0 };

/** The ready-made motifs, then one's own by name; without a user, the ready-made ones. */
export async function listMotifs(
  user: CurrentUser | null,
  { limit, offset }: ListQuery = EVERYTHING,
): Promise<{ items: MotifSummary[]; total: number }> {
  const ready = READY_MOTIFS.flatMap(({ key }) => {
    const presented = presentReadyMotif(key);
    if (!presented) return [];
    const { pattern: _text, ...summary } = presented;
    return [summary];
  });
  const own = user ? await ownMotifs(user) : [];
  const all = [...ready, ...own];
  return { items: all.slice(offset, offset + limit), total: all.length };
}

async function ownMotifs(user: CurrentUser): Promise<MotifSummary[]> {
  const rows = await MotifRow.findAll({
    attributes: { exclude: ['text', 'stitches'] },
    where: { ownerId: user.id },
    order: [[fn('lower', col('name')), 'ASC'], 'id'],
  });
  return rows.map(presentOwnMotifSummary);
}

/** A ready-made motif by its key, or one of one's own by its id. */
export async function getMotif(
  user: CurrentUser,
  key: string,
  transaction?: Transaction,
): Promise<PresentedMotif> {
  const ready = presentReadyMotif(key);
  return ready ?? presentOwnMotif(await loadOwn(MotifRow, user, key, { transaction }));
}

/** What a planner offers: one's own motifs and the ready-made ones. */
export async function planMotifChoices(user: CurrentUser | null): Promise<MotifChoice[]> {
  const own = user ? await ownMotifs(user) : [];
  return [
    ...own.flatMap(({ key, name, sides, version, motif }) =>
      motif ? [{ key, name, sides, rounds: motif.rounds.length, version }] : [],
    ),
    ...motifChoices(),
  ];
}

/** The saves of a motif that are kept, newest first. */
export async function listMotifVersions(
  user: CurrentUser,
  id: string,
): Promise<{ items: PresentedMotifVersion[]; total: number }> {
  const motif = await loadOwn(MotifRow, user, id);
  const rows = await MotifVersion.findAll({
    attributes: { exclude: ['text', 'stitches'] },
    where: { motifId: motif.id },
    order: [['version', 'DESC']],
  });
  const items = rows.map((row) => presentMotifVersion(row, motif.version));
  return { items, total: items.length };
}

/** A motif of one's own as it was saved. */
export async function getMotifVersion(
  user: CurrentUser,
  id: string,
  version: number,
): Promise<PresentedMotif> {
  return presentMotifAsSaved(await loadMotifVersion(await loadOwn(MotifRow, user, id), version));
}

export async function loadMotifVersion(
  motif: MotifRow,
  version: number,
  transaction?: Transaction,
): Promise<MotifVersion> {
  const row = await MotifVersion.findOne({ where: { motifId: motif.id, version }, transaction });
  if (!row) throw new AppError('not-found', 'This save of the motif is not kept.');
  return row;
}
