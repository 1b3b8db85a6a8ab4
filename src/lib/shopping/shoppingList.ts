import type { Estimate } from '../ledger/ledger';
import type { Plan } from '../plan/plan';
import { SKEIN_SPREAD, skeinsFor } from '../skeins/skeins';

/** One dye lot that may be used for a colour of the plan. */
export interface StashLot {
  /** Colour key of the plan. */
  readonly colour: string;
  readonly lotCode: string;
  readonly wholeSkeins: number;
  readonly partMassesG: readonly number[];
  /** Put-up of this lot's yarn. */
  readonly putUpMassG: number;
  readonly putUpLengthM: number;
}

export interface ShoppingLine {
  readonly colour: string;
  readonly name: string;
  readonly hex: string;
  readonly neededM: number;
  readonly neededG: number;
  readonly haveM: number;
  readonly haveG: number;
  readonly toBuySkeins: number;
  /** Whole skeins owned and bought would come from more than one dye lot. */
  readonly mixesLots: boolean;
  readonly costMinor: number | null;
}

export interface ShoppingList {
  readonly currency: string | null;
  readonly lines: readonly ShoppingLine[];
  readonly toBuySkeins: number;
  readonly costMinor: number | null;
}

/**
 * What to buy so that every colour suffices with the plan's confidence, once the stash is used.
 * Skeins to buy: the least whole number that covers what the lots do not, each whole skein as
 * uncertain as its put-up.
 *
 * Example: 1,000 m needed on average, 2 of the 200 m skeins in the stash: 4 to buy at 95 %.
 */
export function shoppingList({
  estimate,
  plan,
  stash,
}: {
  estimate: Estimate;
  plan: Plan;
  stash: readonly StashLot[];
}): ShoppingList {
  const { price, putUp } = plan.yarn;
  const lines = plan.colours.map(({ key, name, hex }, i): ShoppingLine => {
    const need = estimate.colours[i] as Estimate['colours'][number];
    const lots = stash
      .filter(({ colour }) => colour === key)
      .map(lotYarn)
      .filter(({ massG }) => massG > 0);
    const haveM = sum(lots, ({ lengthM }) => lengthM);
    const haveVarianceM2 = sum(lots, ({ varianceM2 }) => varianceM2);
    const toBuySkeins = skeinsFor(
      { meanM: need.meanM - haveM, varianceM2: need.sdM ** 2 + haveVarianceM2 },
      putUp.lengthM,
      plan.confidence,
    );
    return {
      colour: key,
      name,
      hex,
      neededM: need.neededM,
      neededG: need.neededG,
      haveM,
      haveG: sum(lots, ({ massG }) => massG),
      toBuySkeins,
      mixesLots: need.meanM > 0 && lots.length + (toBuySkeins > 0 ? 1 : 0) > 1,
      costMinor: price && toBuySkeins * price.priceMinor,
    };
  });
  return {
    currency: price?.currency ?? null,
    lines,
    toBuySkeins: sum(lines, (line) => line.toBuySkeins),
    costMinor: price && sum(lines, (line) => line.costMinor ?? 0),
  };
}

function lotYarn({ wholeSkeins, partMassesG, putUpMassG, putUpLengthM }: StashLot): {
  massG: number;
  lengthM: number;
  varianceM2: number;
} {
  const massG = wholeSkeins * putUpMassG + partMassesG.reduce((total, part) => total + part, 0);
  return {
    massG,
    lengthM: (massG * putUpLengthM) / putUpMassG,
    varianceM2: wholeSkeins * (SKEIN_SPREAD * putUpLengthM) ** 2,
  };
}

const sum = <T>(items: readonly T[], of: (item: T) => number): number =>
  items.reduce((total, item) => total + of(item), 0);
