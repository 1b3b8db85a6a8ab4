import type { Transaction } from 'sequelize';
import { Colourway, Yarn } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { CurrentUser } from '../../schemas/user';
import type { ColourwayInput, PresentedColourway } from '../../schemas/yarn';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';
import { presentColourway } from '../presenters/yarn';
import { unlessTaken } from './unlessTaken';

export async function createColourway(
  user: CurrentUser,
  { yarnId, name, hex }: ColourwayInput,
  transaction: Transaction,
): Promise<PresentedColourway> {
  const yarn = await Yarn.findByPk(yarnId, { transaction });
  if (!yarn || !owns(user, yarn)) throw invalid({ yarnId: 'You have no such yarn' });
  const kept = await Colourway.count({ where: { yarnId }, transaction });
  if (kept >= KEPT_LIMITS.colourwaysPerYarn) {
    throw invalid({ yarnId: `This yarn has ${kept} colourways, the most there can be` });
  }
  return presentColourway(
    await unlessTaken(
      Colourway.create({ ownerId: user.id, yarnId, name, hex }, { transaction }),
      NAME_TAKEN,
    ),
  );
}

/** The database keeps names unique within a yarn. */
export const NAME_TAKEN = { name: 'This yarn has a colourway of that name already' };
