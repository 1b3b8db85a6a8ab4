import { listOf, listQuery } from '../../../schemas/fields';
import { shoppingListInput, keptShoppingListSchema } from '../../../schemas/shoppingList';
import { createShoppingList } from '../../../server/commands/createShoppingList';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listShoppingLists } from '../../../server/queries/shoppingLists';

export const GET = handle({
  summary: 'List the shopping lists I keep',
  who: 'signed-in',
  query: listQuery,
  response: listOf(keptShoppingListSchema),
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listShoppingLists(user, query),
});

export const POST = handle({
  summary: 'Keep a shopping list of a blanket as it is now',
  who: 'signed-in',
  body: shoppingListInput,
  response: keptShoppingListSchema,
  status: 201,
  example: { body: { blanketId: EXAMPLE_ID } },
  run: ({ user, body, transaction }) => createShoppingList(user, body.blanketId, transaction),
});
