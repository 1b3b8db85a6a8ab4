import type { Transaction } from 'sequelize';
import { Blanket, Colourway, DyeLot } from '../../../db/models';
import { estimate } from '../../lib/ledger/estimate';
import type { Plan } from '../../lib/plan/plan';
import { shoppingList, type StashLot } from '../../lib/shopping/shoppingList';
import { planSchema } from '../../schemas/plan';
import type { BlanketShopping, StashOfColour } from '../../schemas/shoppingList';
import type { PresentedLot } from '../../schemas/stash';
import type { CurrentUser } from '../../schemas/user';
import { AppError } from '../errors';
import { presentLot } from '../presenters/lot';
import { matchStash, type StashColourway } from './matchStash';
import { loadOwn } from './own';
import { WITH_ALL_OF_A_LOT } from './stash';

/** What a blanket still needs once the stash is used: each colour with the dye lots that serve it. */
export async function getBlanketShopping(
  user: CurrentUser,
  blanketId: string,
  transaction?: Transaction,
): Promise<BlanketShopping> {
  const blanket = await loadOwn(Blanket, user, blanketId, { include: 'colourLinks', transaction });
  const plan = readPlan(blanket);
  const links = new Map(
    (blanket.colourLinks ?? []).map(({ colourKey, colourwayId }) => [colourKey, colourwayId]),
  );
  const lots = await ownLots(user, transaction);
  const colourways = await stashColourways(user, [...links.values()], lots, transaction);
  const stash = matchStash(plan, links, colourways);
  const answer = shoppingList({ estimate: estimate(plan), plan, stash: lotsOf(stash, lots) });
  return {
    blanketId: blanket.id,
    title: blanket.title,
    yarnName: plan.yarn.name,
    confidence: plan.confidence,
    currency: answer.currency,
    lines: answer.lines.map((line) => ({
      ...line,
      stash: stash.get(line.colour) as StashOfColour,
    })),
    toBuySkeins: answer.toBuySkeins,
    costMinor: answer.costMinor,
  };
}

function readPlan({ plan }: Blanket): Plan {
  const readable = planSchema.safeParse(plan);
  if (readable.success) return readable.data;
  throw new AppError('gone', 'This plan was made for an older edition: open and save it first.');
}

async function ownLots(user: CurrentUser, transaction?: Transaction): Promise<PresentedLot[]> {
  const rows = await DyeLot.findAll({
    where: { ownerId: user.id },
    include: WITH_ALL_OF_A_LOT,
    order: ['lotCode', 'id'],
    transaction,
  });
  return rows.map(presentLot);
}

/** Every colourway that is in the stash or linked to a colour. */
async function stashColourways(
  user: CurrentUser,
  linkedIds: readonly (string | null)[],
  lots: readonly PresentedLot[],
  transaction?: Transaction,
): Promise<StashColourway[]> {
  const ids = [
    ...linkedIds.filter((id) => id !== null),
    ...lots.map(({ colourway }) => colourway.id),
  ];
  const rows = await Colourway.findAll({
    where: { ownerId: user.id, id: [...new Set(ids)] },
    include: 'yarn',
    order: ['name', 'id'],
    transaction,
  });
  const byColourway = lotsByColourway(lots);
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    hex: row.hex,
    yarnName: row.yarn?.name ?? '',
    weightCategory: row.yarn?.weightCategory ?? -1,
    lots: byColourway.get(row.id) ?? [],
  }));
}

function lotsByColourway(lots: readonly PresentedLot[]): Map<string, PresentedLot[]> {
  const byColourway = new Map<string, PresentedLot[]>();
  for (const lot of lots) {
    const found = byColourway.get(lot.colourway.id);
    if (found) found.push(lot);
    else byColourway.set(lot.colourway.id, [lot]);
  }
  return byColourway;
}

/** The lots that serve a colour, as the library counts them. */
function lotsOf(
  stash: ReadonlyMap<string, StashOfColour>,
  lots: readonly PresentedLot[],
): StashLot[] {
  const byColourway = lotsByColourway(lots);
  return [...stash].flatMap(([colour, { colourway }]) =>
    (byColourway.get(colourway?.id ?? '') ?? []).map(
      ({ lotCode, wholeSkeins, partSkeins, yarn }) => ({
        colour,
        lotCode,
        wholeSkeins,
        partMassesG: partSkeins.map(({ massG }) => massG),
        putUpMassG: yarn.putUp.massG,
        putUpLengthM: yarn.putUp.lengthM,
      }),
    ),
  );
}
