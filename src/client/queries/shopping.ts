import {
  blanketShoppingSchema,
  keptShoppingListSchema,
  type BlanketShopping,
  type KeptShoppingList,
} from '../../schemas/shoppingList';
import { post, put, remove } from '../api';

/** Lets a colourway of the stash serve a colour; null keeps the colour out of the stash. */
export const linkColour = (
  blanketId: string,
  colour: string,
  colourwayId: string | null,
): Promise<BlanketShopping> =>
  put(linkPath(blanketId, colour), { colourwayId }, blanketShoppingSchema);

/** Matches the colour with the stash by its name again. */
export const unlinkColour = (blanketId: string, colour: string): Promise<BlanketShopping> =>
  remove(linkPath(blanketId, colour), blanketShoppingSchema);

export const keepList = (blanketId: string): Promise<KeptShoppingList> =>
  post('/api/shopping-lists', { blanketId }, keptShoppingListSchema);

export const tickLines = (
  { id, version }: KeptShoppingList,
  bought: readonly string[],
): Promise<KeptShoppingList> =>
  put(`/api/shopping-lists/${id}`, { version, bought }, keptShoppingListSchema);

const linkPath = (blanketId: string, colour: string): string =>
  `/api/blankets/${blanketId}/colour-links/${encodeURIComponent(colour)}`;
