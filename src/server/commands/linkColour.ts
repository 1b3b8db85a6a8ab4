import { Op, type Transaction } from 'sequelize';
import { BlanketColourLink, Colourway, type Blanket } from '../../../db/models';
import type { BlanketShopping } from '../../schemas/shoppingList';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { owns } from '../policies/own';
import { invalid } from '../parseParts';
import { getBlanketShopping } from '../queries/blanketShopping';
import { lockBlanket } from './lockBlanket';

/** Lets a colourway of one's own serve a colour of a blanket, or none (null). */
export async function linkColour(
  user: CurrentUser,
  blanketId: string,
  colourKey: string,
  colourwayId: string | null,
  transaction: Transaction,
): Promise<BlanketShopping> {
  const blanket = await lockBlanket(user, blanketId, transaction);
  requireColour(blanket, colourKey);
  if (colourwayId !== null) {
    const colourway = await Colourway.findByPk(colourwayId, { transaction });
    if (!colourway || !owns(user, colourway)) {
      throw invalid({ colourwayId: 'You have no such colourway' });
    }
    await requireFree(blanket, colourKey, colourwayId, transaction);
  }
  await BlanketColourLink.upsert(
    { blanketId, colourKey, ownerId: user.id, colourwayId },
    { transaction },
  );
  return getBlanketShopping(user, blanketId, transaction);
}

/** Goes back to matching the colour by name. */
export async function unlinkColour(
  user: CurrentUser,
  blanketId: string,
  colourKey: string,
  transaction: Transaction,
): Promise<BlanketShopping> {
  const blanket = await lockBlanket(user, blanketId, transaction);
  requireColour(blanket, colourKey);
  await BlanketColourLink.destroy({ where: { blanketId, colourKey }, transaction });
  return getBlanketShopping(user, blanketId, transaction);
}

function requireColour({ plan }: Blanket, colourKey: string): void {
  if (!plan.colours.some(({ key }) => key === colourKey)) {
    throw new AppError('not-found', 'This blanket has no such colour.');
  }
}

/** One colourway never serves two colours: its metres would be counted twice. */
async function requireFree(
  { id: blanketId, plan }: Blanket,
  colourKey: string,
  colourwayId: string,
  transaction: Transaction,
): Promise<void> {
  const other = await BlanketColourLink.findOne({
    where: { blanketId, colourwayId, colourKey: { [Op.ne]: colourKey } },
    transaction,
  });
  if (!other) return;
  const name = plan.colours.find(({ key }) => key === other.colourKey)?.name ?? other.colourKey;
  throw invalid({ colourwayId: `This colourway serves ${name} already` });
}
