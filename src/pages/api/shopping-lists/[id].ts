import { idParams } from '../../../schemas/fields';
import { keptShoppingListSchema, shoppingListUpdate } from '../../../schemas/shoppingList';
import { nothingSchema } from '../../../schemas/schema';
import { deleteShoppingList } from '../../../server/commands/deleteShoppingList';
import { updateShoppingList } from '../../../server/commands/updateShoppingList';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { getShoppingList } from '../../../server/queries/shoppingLists';

export const GET = handle({
  summary: 'Get a shopping list I keep',
  who: 'signed-in',
  params: idParams,
  response: keptShoppingListSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getShoppingList(user, params.id),
});

export const PUT = handle({
  summary: 'Tick off what has been bought',
  who: 'signed-in',
  params: idParams,
  body: shoppingListUpdate,
  response: keptShoppingListSchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID }, body: { version: 1, bought: ['c1', 'c3'] } },
  run: ({ user, params, body, transaction }) =>
    updateShoppingList(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a shopping list I keep',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteShoppingList(user, params.id, transaction),
});
