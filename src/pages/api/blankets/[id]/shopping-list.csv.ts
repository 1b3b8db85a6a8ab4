import { shoppingCsv } from '../../../../lib/shopping/shoppingCsv';
import { csvText, idParams } from '../../../../schemas/fields';
import { EXAMPLE_ID } from '../../../../server/examples';
import { handle } from '../../../../server/handle';
import { csvResponse } from '../../../../server/presenters/csvResponse';
import { getBlanketShopping } from '../../../../server/queries/blanketShopping';

export const GET = handle({
  summary: 'The shopping list of a blanket as CSV',
  description: "RFC 4180, in the person's own units.",
  who: 'signed-in',
  params: idParams,
  response: csvText,
  mediaType: 'text/csv',
  errors: ['not-found', 'gone'],
  example: { params: { id: EXAMPLE_ID } },
  async run({ user, params, preferences }) {
    const shopping = await getBlanketShopping(user, params.id);
    return csvResponse(shoppingCsv(shopping, preferences.units), 'shopping-list.csv');
  },
});
