import { Op, QueryTypes, type Transaction } from 'sequelize';
import { Blanket, MakingTick, MakingWeighing, sequelize } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { Making, Marks } from '../../schemas/making';
import type { CurrentUser } from '../../schemas/user';
import { invalid } from '../parseParts';
import { getMaking } from '../queries/making';
import { lockBlanket } from './lockBlanket';

/**
 * Takes over what a device has marked. Of two marks of one motif the later counts, whichever
 * arrives first; a clock that is ahead counts as now, so that it cannot hold a mark for ever.
 */
export async function markMaking(
  user: CurrentUser,
  id: string,
  marks: Marks,
  now: Date,
  transaction: Transaction,
): Promise<Making> {
  const { id: blanketId } = await lockBlanket(user, id, transaction);
  const notAhead = <Mark extends { at: string }>(mark: Mark): Mark =>
    new Date(mark.at) > now ? { ...mark, at: now.toISOString() } : mark;
  await merge(
    TICKS,
    blanketId,
    latest(marks.ticks.map(notAhead), ({ motif }) => motif),
    transaction,
  );
  await merge(
    WEIGHINGS,
    blanketId,
    latest(marks.weighings.map(notAhead), (weighing) => weighing.id),
    transaction,
  );
  if (marks.order) {
    const { order, at } = notAhead(marks.order);
    await Blanket.update(
      { makingOrder: order, makingOrderAt: new Date(at) },
      {
        where: {
          id: blanketId,
          makingOrderAt: { [Op.or]: [{ [Op.is]: null }, { [Op.lt]: new Date(at) }] },
        },
        silent: true,
        transaction,
      },
    );
  }
  await requireRoom(blanketId, transaction);
  return getMaking(user, id, transaction);
}

/** The latest mark of each thing; of two of one moment the one sent last. */
function latest<Mark extends { at: string }>(
  marks: readonly Mark[],
  keyOf: (mark: Mark) => string,
): Mark[] {
  const byKey = new Map<string, Mark>();
  for (const mark of marks) {
    const before = byKey.get(keyOf(mark));
    if (!before || new Date(mark.at) >= new Date(before.at)) byKey.set(keyOf(mark), mark);
  }
  return [...byKey.values()];
}

const TICKS = `
  INSERT INTO making_ticks (blanket_id, motif, done, at)
  SELECT :blanketId, motif, done, at
  FROM json_to_recordset(:marks) AS mark (motif text, done boolean, at timestamptz)
  ON CONFLICT (blanket_id, motif) DO UPDATE SET done = excluded.done, at = excluded.at
  WHERE excluded.at > making_ticks.at
`;

const WEIGHINGS = `
  INSERT INTO making_weighings (blanket_id, id, colour, left_g, resolution_g, made, tails, gone, at)
  SELECT :blanketId, id, colour, "leftG", "resolutionG", made, tails, gone, at
  FROM json_to_recordset(:marks) AS mark (
    id uuid, colour text, "leftG" double precision, "resolutionG" double precision,
    made json, tails integer, gone boolean, at timestamptz
  )
  ON CONFLICT (blanket_id, id) DO UPDATE SET
    colour = excluded.colour, left_g = excluded.left_g, resolution_g = excluded.resolution_g,
    made = excluded.made, tails = excluded.tails, gone = excluded.gone, at = excluded.at
  WHERE excluded.at > making_weighings.at
`;

async function merge(
  statement: string,
  blanketId: string,
  marks: readonly object[],
  transaction: Transaction,
): Promise<void> {
  if (marks.length === 0) return;
  await sequelize.query(statement, {
    type: QueryTypes.INSERT,
    replacements: { blanketId, marks: JSON.stringify(marks) },
    transaction,
  });
}

async function requireRoom(blanketId: string, transaction: Transaction): Promise<void> {
  const where = { blanketId };
  if ((await MakingTick.count({ where, transaction })) > KEPT_LIMITS.ticksPerBlanket) {
    throw invalid({ ticks: 'A blanket cannot have so many motifs' });
  }
  if ((await MakingWeighing.count({ where, transaction })) > KEPT_LIMITS.weighingsPerBlanket) {
    throw invalid({
      weighings: `At most ${KEPT_LIMITS.weighingsPerBlanket} weighings of a blanket are kept`,
    });
  }
}
