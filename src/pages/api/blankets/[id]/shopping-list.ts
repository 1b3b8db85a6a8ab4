import { idParams } from '../../../../schemas/fields';
import { blanketShoppingSchema } from '../../../../schemas/shoppingList';
import { EXAMPLE_ID } from '../../../../server/examples';
import { handle } from '../../../../server/handle';
import { getBlanketShopping } from '../../../../server/queries/blanketShopping';

export const GET = handle({
  summary: 'What a blanket needs, what the stash has, what to buy',
  who: 'signed-in',
  params: idParams,
  response: blanketShoppingSchema,
  errors: ['not-found', 'gone'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getBlanketShopping(user, params.id),
});
