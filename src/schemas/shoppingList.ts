import * as z from './zod';
import { CONFIDENCES } from '../lib/plan/plan';
import { list, moment, name, strict, uuid, version } from './fields';
import { PLAN_LIMITS } from './limits';

const count = z.number().int();
const colourKey = name('Key of a colour', PLAN_LIMITS.keyLength);

/**
 * How a colour finds its stash: by a link of the person's own, by the name of a colourway of the
 * same weight, not at all because the person said so, or not at all because nothing matches.
 */
export const STASH_MATCHES = ['linked', 'by name', 'kept out', 'none'] as const;

const stashOfColour = z.strictObject({
  match: z.literal(STASH_MATCHES),
  colourway: z
    .strictObject({ id: z.uuid(), name: z.string(), hex: z.string(), yarnName: z.string() })
    .nullable(),
  /** The linked yarn is of another weight category than the plan's. */
  weightDiffers: z.boolean(),
  lots: z.array(
    z.strictObject({ id: z.uuid(), lotCode: z.string(), totalM: z.number(), totalG: z.number() }),
  ),
});
export type StashOfColour = z.output<typeof stashOfColour>;

const shoppingLine = z.strictObject({
  /** Key of the colour in the plan. */
  colour: z.string(),
  name: z.string(),
  hex: z.string(),
  neededM: z.number(),
  neededG: z.number(),
  haveM: z.number(),
  haveG: z.number(),
  toBuySkeins: count,
  mixesLots: z.boolean(),
  costMinor: count.nullable(),
  stash: stashOfColour,
});
export type ShoppingLine = z.output<typeof shoppingLine>;

/** What a blanket still needs, as things are now. */
export const blanketShoppingSchema = z.strictObject({
  blanketId: z.uuid(),
  title: z.string(),
  yarnName: z.string(),
  confidence: z.literal(CONFIDENCES),
  currency: z.string().nullable(),
  lines: z.array(shoppingLine),
  toBuySkeins: count,
  costMinor: count.nullable(),
});
export type BlanketShopping = z.output<typeof blanketShoppingSchema>;

/** Which colourway of the stash serves a colour; null keeps the colour out of the stash. */
export const colourLinkInput = strict('Link', { colourwayId: uuid.nullable() });
export const colourLinkParams = z.strictObject({ id: uuid, colour: colourKey });

/** A list is kept of a blanket as it is now. */
export const shoppingListInput = strict('Shopping list', { blanketId: uuid });
/** Lines are ticked off by the keys of their colours. */
export const shoppingListUpdate = strict('Shopping list', {
  version,
  bought: list('Lines bought', colourKey, 0, PLAN_LIMITS.colours),
});
export type ShoppingListUpdate = z.output<typeof shoppingListUpdate>;

export const keptShoppingListSchema = z.strictObject({
  id: z.uuid(),
  version,
  createdAt: moment,
  updatedAt: moment,
  /** Null once the blanket is gone. */
  blanketId: z.uuid().nullable(),
  title: z.string(),
  yarnName: z.string(),
  confidence: z.literal(CONFIDENCES),
  currency: z.string().nullable(),
  lines: z.array(shoppingLine.extend({ bought: z.boolean() })),
  toBuySkeins: count,
  costMinor: count.nullable(),
});
export type KeptShoppingList = z.output<typeof keptShoppingListSchema>;
