import { UniqueConstraintError, type Transaction } from 'sequelize';
import { Colourway, Yarn } from '../../../db/models';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { CurrentUser } from '../../schemas/user';
import type { ColourwayInput, PresentedColourway } from '../../schemas/yarn';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';
import { presentColourway } from '../presenters/yarn';

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
    await onceByName(Colourway.create({ ownerId: user.id, yarnId, name, hex }, { transaction })),
  );
}

/** The database keeps names unique within a yarn; this says so beside the field. */
export async function onceByName(saving: Promise<Colourway>): Promise<Colourway> {
  try {
    return await saving;
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw invalid({ name: 'This yarn has a colourway of that name already' });
  }
}
